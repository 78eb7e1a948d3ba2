import { LIMITS } from '../../../shared/limits';
import type { StationBody } from '../../../shared/studies/schemas';
import { conflict } from '../../errors';
import type { StationModel } from '../../models/Station';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from './studySubject';

/** Named places on the reach of a study. */
export function buildStations({ models, sequelize }: Platform) {
  const { Station, Study } = models;

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<StationModel> | null> {
    const station = await Station.findByPk(id);
    const study = station && (await Study.findByPk(station.studyId));
    return study && { record: station, subject: await studySubject(models, study, actor) };
  }

  const list = (studyId: number): Promise<StationModel[]> =>
    Station.findAll({
      where: { studyId },
      order: [
        ['chainage', 'ASC'],
        ['id', 'ASC'],
      ],
    });

  /** Throws `conflict` where the study has as many as it may. */
  const create = (study: StudyModel, body: StationBody): Promise<StationModel> =>
    sequelize.transaction(async (transaction) => {
      await Study.findByPk(study.id, { transaction, lock: transaction.LOCK.UPDATE });
      const count = await Station.count({ where: { studyId: study.id }, transaction });
      if (count >= LIMITS.stationsPerStudy)
        throw conflict(
          `A study has at most ${LIMITS.stationsPerStudy} stations. Remove one that is not needed.`,
        );
      return Station.create({ ...body, studyId: study.id }, { transaction });
    });

  const change = (station: StationModel, body: StationBody) => station.update(body);
  const remove = (station: StationModel) => station.destroy();

  return { load, list, create, change, remove };
}
