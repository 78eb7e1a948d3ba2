import type {
  PasswordChangeBody,
  PasswordResetConfirmBody,
} from '../../../shared/accounts/schemas';
import type { Attempts } from '../../auth/attempts';
import type { OneTimeLinks } from '../../auth/oneTimeLinks';
import type { SignedIn } from '../../auth/passport';
import { fitsPassword, hashPassword } from '../../auth/passwords';
import type { Sessions } from '../../auth/sessions';
import type { Background } from '../../background';
import { gone, invalid } from '../../errors';
import type { Mailer } from '../../mail/Mailer';
import { passwordChangedMessage } from '../../mail/messages/passwordChanged';
import { passwordResetMessage } from '../../mail/messages/passwordReset';
import type { Platform } from '../../platform';

interface Needs {
  attempts: Attempts;
  background: Background;
  links: OneTimeLinks;
  mailer: Mailer;
  sessions: Sessions;
}

/** Change of a password by who knows it, and a new one by mail for who does not. */
export function buildPasswords(
  { audit, env, models, sequelize }: Platform,
  { attempts, background, links, mailer, sessions }: Needs,
) {
  const { User } = models;

  const tellOf = (email: string) =>
    background.run('telling of a changed password', () =>
      mailer.send(passwordChangedMessage(email, `${env.publicUrl}/forgot`)),
    );

  /** Keeps the session that asks and ends the others. Throws `invalid`, `tooMany`. */
  async function change(signedIn: SignedIn, { current, next }: PasswordChangeBody): Promise<void> {
    const user = await User.findByPk(signedIn.id, { rejectOnEmpty: true });
    // Whoever holds a stolen device may not try passwords here faster than at the door.
    await attempts.begin(user.email);
    if (!(await fitsPassword(user.passwordHash, current)))
      throw invalid([{ path: 'current', message: 'This is not your present password.' }]);
    await attempts.forget(user.email);
    const passwordHash = await hashPassword(next);
    await sequelize.transaction(async (transaction) => {
      await user.update({ passwordHash }, { transaction });
      await sessions.endAll(user.id, transaction, signedIn.family);
      await links.end('reset', { userId: user.id }, transaction);
      const told = { action: 'password.changed', words: 'Password changed', actor: user };
      await audit.note(told, transaction);
    });
    tellOf(user.email);
  }

  /** Answers at once and alike; the link goes out afterwards where there is an active account. */
  function requestReset(email: string): void {
    background.run('sending a reset link', async () => {
      const user = await User.findOne({ where: { email, active: true } });
      if (!user) return;
      const words = `New password asked for by mail: ${email}`;
      const { firmId } = user;
      await audit.note({ action: 'password.resetAsked', words, firmId, actorName: email });
      const link = await links.issue('reset', { userId: user.id });
      await mailer.send(passwordResetMessage(email, link));
    });
  }

  /** Sets the password by a link and ends every session. Throws `gone`. */
  async function confirmReset({ token, password }: PasswordResetConfirmBody): Promise<void> {
    await links.look('reset', token);
    const passwordHash = await hashPassword(password);
    const user = await sequelize.transaction(async (transaction) => {
      const { userId } = await links.take('reset', token, transaction);
      const found = await User.findByPk(userId!, { transaction, rejectOnEmpty: true });
      if (!found.active)
        throw gone('This account is not active. Ask an administrator of your firm.');
      await found.update({ passwordHash, tokenVersion: found.tokenVersion + 1 }, { transaction });
      await sessions.endAll(found.id, transaction);
      const words = 'New password chosen by a link';
      await audit.note({ action: 'password.reset', words, actor: found }, transaction);
      return found;
    });
    await attempts.forget(user.email);
    tellOf(user.email);
  }

  return { change, requestReset, confirmReset };
}
