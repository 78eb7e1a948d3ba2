import { OBSERVATION_LIMITS, type GaugeBody } from '../../../shared/calibration/schemas';
import type { TimeValues } from '../../../shared/calibration/types';
import { packJson, unpackJson } from '../../database/packedJson';
import { conflict } from '../../errors';
import type { GaugeModel } from '../../models/Gauge';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';
import { touchStudy } from '../studies/touchStudy';

export interface GaugeRecord {
  stage: TimeValues | null;
  flow: TimeValues | null;
}

/** What gauges recorded. */
export function buildGauges(platform: Platform) {
  const { models, sequelize } = platform;
  const { Gauge, Study } = models;

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<GaugeModel> | null> {
    const gauge = await Gauge.findByPk(id);
    const study = gauge && (await Study.findByPk(gauge.studyId));
    return study && { record: gauge, subject: await studySubject(models, study, actor) };
  }

  const list = (studyId: number): Promise<GaugeModel[]> =>
    Gauge.findAll({
      where: { studyId },
      order: [
        ['chainage', 'ASC'],
        ['id', 'ASC'],
      ],
    });

  async function recordOf({ id }: { id: number }): Promise<GaugeRecord> {
    const { record } = await Gauge.scope('withRecord').findByPk(id, { rejectOnEmpty: true });
    return unpackJson<GaugeRecord>(record);
  }

  const create = (study: StudyModel, body: GaugeBody): Promise<GaugeModel> =>
    sequelize.transaction(async (transaction) => {
      await Study.findByPk(study.id, { transaction, lock: transaction.LOCK.UPDATE });
      const count = await Gauge.count({ where: { studyId: study.id }, transaction });
      const most = OBSERVATION_LIMITS.gaugesPerStudy;
      if (count >= most)
        throw conflict(
          `A study holds at most ${most} gauge records. Remove one that is not needed.`,
        );
      const made = await Gauge.create(
        { ...(await columnsOf(body)), studyId: study.id },
        { transaction },
      );
      await touchStudy(platform, study.id, transaction);
      return made;
    });

  const change = async (gauge: GaugeModel, body: GaugeBody) => gauge.update(await columnsOf(body));
  const remove = (gauge: GaugeModel) => gauge.destroy();

  return { load, list, recordOf, create, change, remove };
}

async function columnsOf({ name, chainage, flood, startsAt, stage, flow }: GaugeBody) {
  const record: GaugeRecord = { stage, flow };
  const peak = (of: TimeValues | null) =>
    of ? of.values.reduce((a, b) => Math.max(a, b), -Infinity) : null;
  return {
    name,
    chainage,
    flood,
    startsAt: startsAt === null ? null : new Date(startsAt),
    stageCount: stage?.times.length ?? 0,
    flowCount: flow?.times.length ?? 0,
    peakStage: peak(stage),
    peakFlow: peak(flow),
    record: await packJson(record),
  };
}
