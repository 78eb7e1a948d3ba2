import { newScenario } from '../../../shared/scenarios/proposals';
import type { ScenarioBody } from '../../../shared/scenarios/schemas';
import { unpackJson } from '../../../server/database/packedJson';
import type { Services } from '../../../server/composition';
import type { ReachModel } from '../../../server/models/Reach';
import type { ScenarioModel } from '../../../server/models/Scenario';
import { countFaults } from '../../../server/services/scenarios/countFaults';
import type { Section } from '../../../shared/surveys/types';
import { nextNumber } from './counter';

/** A complete scenario: a small flood on the reach, two hours long. `change` edits its body. */
export async function buildScenario(
  { models }: Services,
  reach: ReachModel,
  change: (body: ScenarioBody) => ScenarioBody = (body) => body,
): Promise<ScenarioModel> {
  const sections = await unpackJson<Section[]>(reach.sections);
  const proposed = newScenario(`Flood ${nextNumber()}`, reach.id, sections);
  const body = change({
    ...proposed,
    upstream: {
      kind: 'table',
      times: [0, 1800, 3600, 7200],
      flows: [10, 40, 20, 10],
    },
    numerics: { ...proposed.numerics, cellSize: 50, duration: 7200, outputInterval: 300 },
  });
  return models.Scenario.create({
    studyId: reach.studyId,
    reachId: reach.id,
    name: body.name,
    body,
    peakInflow: 40,
    faultCount: countFaults(body, sections),
    updatedBy: reach.updatedBy,
  });
}
