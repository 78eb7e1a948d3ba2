import { OBSERVATION_LIMITS, type MarkBody } from '../../../shared/calibration/schemas';
import { conflict } from '../../errors';
import type { MarkModel } from '../../models/Mark';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';
import { touchStudy } from '../studies/touchStudy';

/** How high the water stood, as people and the river left it. */
export function buildMarks(platform: Platform) {
  const { models, sequelize } = platform;
  const { Mark, Study } = models;

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<MarkModel> | null> {
    const mark = await Mark.findByPk(id);
    const study = mark && (await Study.findByPk(mark.studyId));
    return study && { record: mark, subject: await studySubject(models, study, actor) };
  }

  const list = (studyId: number): Promise<MarkModel[]> =>
    Mark.findAll({
      where: { studyId },
      order: [
        ['chainage', 'ASC'],
        ['id', 'ASC'],
      ],
    });

  /** All of them or none. Throws `conflict` where the study would hold more than it may. */
  const add = (study: StudyModel, bodies: MarkBody[]): Promise<MarkModel[]> =>
    sequelize.transaction(async (transaction) => {
      await Study.findByPk(study.id, { transaction, lock: transaction.LOCK.UPDATE });
      const count = await Mark.count({ where: { studyId: study.id }, transaction });
      const most = OBSERVATION_LIMITS.marksPerStudy;
      if (count + bodies.length > most)
        throw conflict(
          `A study holds at most ${most} marks and has ${count}. Nothing was added; send fewer.`,
        );
      const rows = bodies.map((body) => ({ ...body, studyId: study.id }));
      const made = await Mark.bulkCreate(rows, { transaction });
      await touchStudy(platform, study.id, transaction);
      return made;
    });

  const change = (mark: MarkModel, body: MarkBody) => mark.update(body);
  const remove = (mark: MarkModel) => mark.destroy();

  return { load, list, add, change, remove };
}
