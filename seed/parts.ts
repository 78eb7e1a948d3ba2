import type { Services } from '../server/composition';
import type { StudyModel } from '../server/models/Study';
import type { UserModel } from '../server/models/User';
import { seedGeometry } from './geometry';
import { OBSERVED_GAUGE, OBSERVED_MARKS } from './observations';
import { VESHALL_STATIONS } from './veshall';

type Part = (services: Services, study: StudyModel, modeller: UserModel) => Promise<void>;

/**
 * What came to the demo study after its first version, by the words that the audit trail keeps. Each is loaded once into a
 * data directory, also into one that is older than it; what people change or delete afterwards stays so.
 */
const PARTS: Record<string, Part> = {
  'Demo data: observed marks and a gauge record': seedObservations,
  'Demo data: levels at the stations': seedLevels,
  'Demo data: a working geometry': seedGeometry,
};
const ACTION = 'demo.loaded';

export async function seedParts(
  services: Services,
  study: StudyModel,
  modeller: UserModel,
): Promise<void> {
  const { audit, models } = services;
  for (const [words, load] of Object.entries(PARTS)) {
    const record = { recordKind: 'study', recordId: study.id };
    if (await models.AuditRow.findOne({ where: { action: ACTION, words, ...record } })) continue;
    await load(services, study, modeller);
    await audit.note({
      action: ACTION,
      words,
      record: { kind: 'study', id: study.id },
      actor: modeller,
    });
  }
}

/** What an earlier flood left behind, where the study has nothing observed yet. */
async function seedObservations({ models, observations }: Services, study: StudyModel) {
  const where = { studyId: study.id };
  if ((await models.Mark.count({ where })) === 0)
    await observations.marks.add(study, OBSERVED_MARKS);
  if ((await models.Gauge.count({ where })) === 0)
    await observations.gauges.create(study, OBSERVED_GAUGE);
}

/** Levels of the demo's stations, where they still stand as they were loaded and none has a level. */
async function seedLevels({ stations }: Services, study: StudyModel) {
  const there = await stations.list(study.id);
  if (there.some(({ levels }) => levels?.length)) return;
  for (const { levels, name, chainage } of VESHALL_STATIONS) {
    const station = there.find((one) => one.name === name && one.chainage === chainage);
    if (station && levels?.length) await stations.change(station, { name, chainage, levels });
  }
}
