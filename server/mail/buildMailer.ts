import type { Env } from '../env';
import type { Mailer } from './Mailer';
import { fileMailer } from './fileMailer';
import { smtpMailer } from './smtpMailer';

export const buildMailer = (env: Env, now: () => Date): Mailer =>
  env.smtpUrl ? smtpMailer(env.smtpUrl, env.mailFrom) : fileMailer(env.mailDir, env.mailFrom, now);
