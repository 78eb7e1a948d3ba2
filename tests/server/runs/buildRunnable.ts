import type { Services } from '../../../server/composition';
import type { UserModel } from '../../../server/models/User';
import type { ScenarioBody } from '../../../shared/scenarios/schemas';
import type { Section } from '../../../shared/surveys/types';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildStudy } from '../../helpers/factories/buildStudy';

/** A straight reach of 2 km, four sections, that falls 1 m a km. */
export const SECTIONS: Section[] = [0, 600, 1300, 2000].map((chainage, k) => {
  const bed = 20 - chainage / 1000;
  return {
    id: `XS-0${k + 1}`,
    chainage,
    points: [
      [0, bed + 6],
      [15, bed + 3],
      [20, bed],
      [30, bed],
      [35, bed + 3],
      [50, bed + 6],
    ],
    roughness: [
      [0, 0.06],
      [15, 0.035],
      [35, 0.06],
    ],
    banks: [15, 35],
    coordinates: null,
  };
});

export const scenarioBody = (reachId: number, numerics = {}): ScenarioBody => ({
  name: '1 in 100 year',
  reachId,
  startsAt: '2026-11-14T06:00:00.000Z',
  note: '',
  upstream: { kind: 'table', times: [0, 1800, 5400, 7200], flows: [20, 120, 30, 20] },
  laterals: [],
  downstream: { kind: 'normalDepth', slope: 0.001 },
  initial: { kind: 'steady' },
  numerics: {
    cellSize: 50,
    duration: 7200,
    outputInterval: 120,
    order: 2,
    courant: null,
    dryDepth: null,
    ...numerics,
  },
});

/** A study of the user's firm with a scenario that can be routed in about a second, and two stations. */
export async function buildRunnable(services: Services, user: UserModel, numerics = {}) {
  const study = await buildStudy(services, user, { title: 'Lower Veshall' });
  const reach = await buildReach(services, study, SECTIONS);
  const scenario = await buildScenario(services, reach, () => scenarioBody(reach.id, numerics));
  for (const [name, chainage] of [
    ['Mill', 1000],
    ['Gauge', 1300],
  ] as const) {
    await services.models.Station.create({ studyId: study.id, name, chainage });
  }
  return { study, reach, scenario };
}
