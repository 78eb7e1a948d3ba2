import type { MemberBody } from '../../../shared/studies/schemas';
import { ROLE_NAMES } from '../../../shared/accounts/roles';
import { invalid, notFound } from '../../errors';
import type { StudyMemberModel } from '../../models/StudyMember';
import type { Platform } from '../../platform';
import type { StudyModel } from '../../models/Study';

/** Surveyors and clients with whom a study is shared. */
export function buildMembers({ models }: Platform) {
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
    await StudyMember.upsert({ studyId: study.id, userId, as });
    return list(study);
  }

  async function remove(study: StudyModel, userId: number): Promise<void> {
    const count = await StudyMember.destroy({ where: { studyId: study.id, userId } });
    if (count === 0) throw notFound('This sharing');
  }

  return { list, put, remove };
}
