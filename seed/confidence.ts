import {
  convergenceSchema,
  ensembleSchema,
  sensitivitySchema,
  type ConfidenceKind,
  type SettingsOf,
} from '../shared/confidence/schemas';
import { PARAMETERS } from '../shared/confidence/parameters';
import type { Services } from '../server/composition';
import { person, routed } from './checks';
import { LARGER_FLOOD } from './scenarios';

const CELLS = 100;
const VARIED = [PARAMETERS.roughness, PARAMETERS.peakFlow, PARAMETERS.outletSlope];

/** Large cells where there are many members: the demo is not to keep a machine busy. */
const SETTINGS: { [K in ConfidenceKind]: (stationIds: number[]) => SettingsOf[K] } = {
  convergence: (stationIds) => convergenceSchema.cast({ stationIds }),
  sensitivity: (stationIds) =>
    sensitivitySchema.cast({
      stationIds,
      cellSize: CELLS,
      parameters: VARIED.map(({ key, sides: [low, high] }) => ({ key, low, high })),
    }),
  ensemble: (stationIds) =>
    ensembleSchema.cast({
      stationIds,
      cellSize: CELLS,
      members: 40,
      seed: 1974,
      parameters: VARIED.map(({ key, distribution }) => ({ key, distribution })),
    }),
};

/** Asks for a set of each kind of the larger flood once it is routed, where there is none. They are computed on the queue. */
export async function seedConfidence(services: Services): Promise<void> {
  let stopped = false;
  services.onClose(() => void (stopped = true));
  const modeller = await person(services, 'Ines Corrow');
  const run = modeller && (await routed(services, modeller, LARGER_FLOOD, () => stopped));
  if (!modeller || !run || stopped) return;
  const there = await services.tasks.find.list({ runId: run.id });
  const stationIds = (await services.runs.results.stations(run.studyId)).map(({ id }) => id);
  const ask = async <K extends ConfidenceKind>(kind: K) => {
    if (there.some(({ set }) => set.kind === kind)) return;
    await services.confidence.request(modeller, run, kind, SETTINGS[kind](stationIds));
  };
  await ask('convergence');
  await ask('sensitivity');
  await ask('ensemble');
}
