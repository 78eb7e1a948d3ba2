import type { Transaction } from 'sequelize';
import type { Platform } from '../../platform';

/** Moves a study to the head of the lists: something in it was worked on. */
export const touchStudy = (
  { models, now }: Pick<Platform, 'models' | 'now'>,
  studyId: number,
  transaction?: Transaction,
) =>
  models.Study.update({ updatedAt: now() }, { where: { id: studyId }, silent: true, transaction });
