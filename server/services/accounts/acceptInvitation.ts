import { Op, UniqueConstraintError, type Transaction } from 'sequelize';
import type { InvitationAcceptBody } from '../../../shared/accounts/schemas';
import type { OneTimeLinks } from '../../auth/oneTimeLinks';
import { hashPassword } from '../../auth/passwords';
import type { Sessions, Tokens } from '../../auth/sessions';
import { conflict } from '../../errors';
import type { InvitationModel } from '../../models/Invitation';
import type { UserModel } from '../../models/User';
import type { Platform } from '../../platform';

/**
 * Makes the account that a link offers, with the studies and roles of every open invitation of the same firm to the same
 * address, and signs it in. Throws `gone`, and `conflict` where the address has an account.
 */
export function buildAcceptInvitation(
  { audit, models, sequelize, now }: Platform,
  links: OneTimeLinks,
  sessions: Sessions,
) {
  const { Invitation, StudyMember, User } = models;

  const accept = async ({ token, name, password }: InvitationAcceptBody): Promise<Tokens> => {
    await links.look('invitation', token);
    const passwordHash = await hashPassword(password);
    try {
      return await sequelize.transaction(async (transaction) => {
        const { invitationId } = await links.take('invitation', token, transaction);
        const invitation = await Invitation.findByPk(invitationId!, {
          transaction,
          rejectOnEmpty: true,
        });
        const open = await openOf(invitation, transaction);
        const created = await User.create(
          {
            firmId: invitation.firmId,
            email: invitation.email,
            name,
            passwordHash,
            roles: [...new Set(open.flatMap(({ roles }) => roles))],
            lastSignInAt: now(),
          },
          { transaction },
        );
        await share(open, created, transaction);
        await Invitation.update(
          { acceptedAt: now() },
          { where: { id: open.map(({ id }) => id) }, transaction },
        );
        const user = await created.reload({ include: 'firm', transaction });
        const tokens = await sessions.start(user, transaction);
        const words = `Invitation accepted by ${name}, ${created.roles.join(', ')}`;
        const record = { kind: 'user', id: created.id };
        const told = { action: 'invitation.accepted', words, record, actor: created };
        await audit.note(told, transaction);
        return tokens;
      });
    } catch (error) {
      if (!(error instanceof UniqueConstraintError)) throw error;
      throw conflict(
        'There is an account with this address already. Sign in with it, or ask to be invited at another address.',
      );
    }
  };

  const openOf = ({ email, firmId }: InvitationModel, transaction: Transaction) =>
    Invitation.findAll({
      where: {
        email,
        firmId,
        acceptedAt: null,
        withdrawnAt: null,
        expiresAt: { [Op.gt]: now() },
      },
      order: [['id', 'ASC']],
      lock: transaction.LOCK.UPDATE,
      transaction,
    });

  async function share(open: InvitationModel[], user: UserModel, transaction: Transaction) {
    const shared = new Map<number, 'surveyor' | 'client'>();
    for (const { studyId, roles } of open)
      if (studyId != null)
        // A person who does both in one study sends surveys: reading is part of that.
        shared.set(studyId, roles.includes('surveyor') ? 'surveyor' : 'client');
    await StudyMember.bulkCreate(
      [...shared].map(([studyId, as]) => ({ studyId, userId: user.id, as })),
      { transaction },
    );
  }

  return accept;
}
