import type { ProfileBody, UserChangeBody } from '../../../shared/accounts/schemas';
import type { OneTimeLinks } from '../../auth/oneTimeLinks';
import type { Sessions } from '../../auth/sessions';
import { conflict } from '../../errors';
import type { UserModel } from '../../models/User';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';

/** People of a firm: their own record, and what administrators change. */
export function buildUsers(
  { audit, models, sequelize }: Platform,
  sessions: Sessions,
  links: OneTimeLinks,
) {
  const { User } = models;

  /** For `authorize`. */
  async function load(id: number): Promise<Loaded<UserModel> | null> {
    const user = await User.findByPk(id);
    return user && { record: user, subject: { firmId: user.firmId } };
  }

  const me = (id: number): Promise<UserModel> =>
    User.findByPk(id, { include: 'firm', rejectOnEmpty: true });

  async function changeProfile(id: number, profile: ProfileBody): Promise<UserModel> {
    const user = await me(id);
    return user.update(profile);
  }

  /** Administrators see everybody; engineers the surveyors and clients with whom a study can be shared. */
  async function list(actor: Actor): Promise<UserModel[]> {
    const users = await User.findAll({
      where: { firmId: actor.firmId },
      order: [
        ['name', 'ASC'],
        ['id', 'ASC'],
      ],
    });
    if (actor.roles.includes('administrator')) return users;
    return users.filter(
      ({ active, roles }) => active && (roles.includes('surveyor') || roles.includes('client')),
    );
  }

  /**
   * Sets roles and activity. Access tokens of the user end, so that the change holds at once; deactivating ends the
   * sessions too. Throws `conflict` where the firm would be left without an active administrator.
   */
  async function change(user: UserModel, body: UserChangeBody): Promise<UserModel> {
    return sequelize.transaction(async (transaction) => {
      // Locks the firm's accounts: two administrators cannot demote each other at the same moment.
      const firm = await User.findAll({
        where: { firmId: user.firmId },
        lock: transaction.LOCK.UPDATE,
        transaction,
      });
      const roles = body.roles ? [...new Set(body.roles)] : user.roles;
      const active = body.active ?? user.active;
      const administers = (person: { roles: UserModel['roles']; active: boolean }) =>
        person.active && person.roles.includes('administrator');
      const left = firm.filter((person) =>
        administers(person.id === user.id ? { roles, active } : person),
      );
      if (left.length === 0)
        throw conflict(
          'A firm needs an active administrator. Give the role to somebody else first.',
        );
      await user.update({ roles, active, tokenVersion: user.tokenVersion + 1 }, { transaction });
      if (!active) {
        await sessions.endAll(user.id, transaction);
        await links.end('reset', { userId: user.id }, transaction);
      }
      const words = `${user.name}: ${active ? roles.join(', ') : 'account closed'}`;
      const record = { kind: 'user', id: user.id };
      await audit.note({ action: 'user.changed', words, record }, transaction);
      return user;
    });
  }

  async function signOutEverywhere(id: number): Promise<void> {
    await sequelize.transaction(async (transaction) => {
      await User.increment('tokenVersion', { where: { id }, transaction });
      await sessions.endAll(id, transaction);
    });
  }

  return { load, me, changeProfile, list, change, signOutEverywhere };
}
