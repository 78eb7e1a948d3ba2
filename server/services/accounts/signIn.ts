import type { InferType } from 'yup';
import type { signInSchema } from '../../../shared/accounts/schemas';
import type { Attempts } from '../../auth/attempts';
import { fitsPassword } from '../../auth/passwords';
import type { Sessions, Tokens } from '../../auth/sessions';
import { AppError } from '../../errors';
import type { Platform } from '../../platform';

/**
 * Signs in with e-mail and password. Throws `tooMany` while the account must wait, and `signInFailed` alike for a wrong
 * password, an account that does not exist and one that is not active.
 */
export const buildSignIn =
  ({ audit, models, now }: Platform, attempts: Attempts, sessions: Sessions) =>
  async ({ email, password }: InferType<typeof signInSchema>): Promise<Tokens> => {
    await attempts.begin(email);
    const user = await models.User.findOne({ where: { email, active: true }, include: 'firm' });
    const fits = await fitsPassword(user?.passwordHash ?? null, password);
    if (!user || !fits) {
      await audit.note({
        action: 'session.started',
        words: 'Signing in refused: address and password do not belong together',
        firmId: (await models.User.findOne({ where: { email } }))?.firmId,
        actorName: email,
        outcome: 'refused',
      });
      throw new AppError(
        'signInFailed',
        'E-mail address and password do not belong together. Check both, or choose a new password by mail.',
      );
    }
    await attempts.forget(email);
    await user.update({ lastSignInAt: now() });
    const tokens = await sessions.start(user);
    await audit.note({ action: 'session.started', words: 'Signed in', actor: user });
    return tokens;
  };
