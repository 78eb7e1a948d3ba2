import type { OneTimeLinks } from '../../auth/oneTimeLinks';
import { hashPassword } from '../../auth/passwords';
import { makeToken } from '../../auth/oneWayToken';
import { conflict } from '../../errors';
import type { Platform } from '../../platform';

/** New firms. No route leads here: whoever runs the server opens them. */
export function buildFirms({ audit, models, sequelize }: Platform, links: OneTimeLinks) {
  const { Firm, User } = models;

  /**
   * Opens a firm with its first administrator, and answers the link by which that person sets a password. Throws
   * `conflict` where the firm or the address is known.
   */
  async function open(firmName: string, name: string, email: string): Promise<string> {
    // Nobody knows it: the link sets the first password.
    const passwordHash = await hashPassword(makeToken());
    return sequelize.transaction(async (transaction) => {
      if (await Firm.findOne({ where: { name: firmName }, transaction }))
        throw conflict(`There is a firm "${firmName}" already.`);
      if (await User.findOne({ where: { email }, transaction }))
        throw conflict(`${email} has an account already.`);
      const firm = await Firm.create({ name: firmName }, { transaction });
      const user = await User.create(
        { firmId: firm.id, email, name, roles: ['administrator'], passwordHash },
        { transaction },
      );
      const link = await links.issue('reset', { userId: user.id }, transaction);
      const told = {
        action: 'firm.opened',
        words: `Firm opened with ${name} as its administrator`,
        record: { kind: 'firm', id: firm.id },
        firmId: firm.id,
        actorName: 'whoever runs the server',
      };
      await audit.note(told, transaction);
      return link;
    });
  }

  return { open };
}
