import type { StudyMember } from '../../../shared/studies/types';
import type { Services } from '../../../server/composition';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { nextNumber } from './counter';

/** A study of the user's firm. */
export const buildStudy = (
  { models }: Services,
  creator: UserModel,
  given: Partial<Pick<StudyModel, 'title' | 'unitSystem'>> = {},
): Promise<StudyModel> =>
  models.Study.create({
    firmId: creator.firmId,
    title: `Study ${nextNumber()}`,
    clientName: 'Client Council',
    place: 'Tornick',
    verticalDatum: 'Local datum',
    unitSystem: 'metric',
    purpose: '',
    createdBy: creator.id,
    ...given,
  });

/** Shares a study. */
export const buildMember = (
  { models }: Services,
  study: StudyModel,
  user: UserModel,
  as: StudyMember['as'],
) => models.StudyMember.create({ studyId: study.id, userId: user.id, as });
