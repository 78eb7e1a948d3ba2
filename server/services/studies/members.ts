import type { Transaction } from 'sequelize';
import type { MemberBody } from '../../../shared/studies/schemas';
import { ROLE_NAMES } from '../../../shared/accounts/roles';
import { invalid, notFound } from '../../errors';
import type { StudyMemberModel } from '../../models/StudyMember';
import type { Platform } from '../../platform';
import type { StudyModel } from '../../models/Study';

/** Surveyors and clients with whom a study is shared. */
export function buildMembers({ audit, models, sequelize }: Platform) {
  const { StudyMember, User } = models;

  const list = (study: StudyModel): Promise<StudyMemberModel[]> =>
    StudyMember.findAll({
      where: { studyId: study.id },
      include: 'user',
      order: [
        ['as', 'ASC'],
        ['id', 'ASC'],
      ],
    });

  /** Shares, or changes as what. Throws `invalid` where the person is not of the firm, inactive, or has not that role. */
  async function put(study: StudyModel, { userId, as }: MemberBody): Promise<StudyMemberModel[]> {
    const user = await User.findOne({ where: { id: userId, firmId: study.firmId } });
    if (!user) throw invalid([{ path: 'userId', message: 'No such person in your firm.' }]);
    if (!user.active)
      throw invalid([{ path: 'userId', message: `${user.name} has no active account.` }]);
    if (!user.roles.includes(as))
      throw invalid([
        {
          path: 'as',
          message: `${user.name} is no ${ROLE_NAMES[as].toLowerCase()}. An administrator can give the role.`,
        },
      ]);
    await sequelize.transaction(async (transaction) => {
      await StudyMember.upsert({ studyId: study.id, userId, as }, { transaction });
      const words = `${study.title} shared with ${user.name} as ${ROLE_NAMES[as].toLowerCase()}`;
      await tell('study.shared', words, study, transaction);
    });
    return list(study);
  }

  async function remove(study: StudyModel, userId: number): Promise<void> {
    await sequelize.transaction(async (transaction) => {
      const where = { studyId: study.id, userId };
      const member = await StudyMember.findOne({ where, include: 'user', transaction });
      if (!member) throw notFound('This sharing');
      await member.destroy({ transaction });
      const words = `${study.title} no longer shared with ${member.user!.name}`;
      await tell('study.unshared', words, study, transaction);
    });
  }

  const tell = (
    action: string,
    words: string,
    { id, firmId }: StudyModel,
    transaction: Transaction,
  ) => audit.note({ action, words, record: { kind: 'study', id }, firmId }, transaction);

  return { list, put, remove };
}
