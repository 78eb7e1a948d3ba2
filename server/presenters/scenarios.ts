import { checkScenario } from '../../shared/scenarios/checkScenario';
import { proposals } from '../../shared/scenarios/proposals';
import type { Scenario, ScenarioRow } from '../../shared/scenarios/types';
import type { Section } from '../../shared/surveys/types';
import type { ScenarioModel } from '../models/Scenario';
import type { UnitSystem } from '../../shared/units/units';

/** Needs the scenario's `updater`. */
export const presentScenarioRow = (scenario: ScenarioModel, runCount: number): ScenarioRow => ({
  id: scenario.id,
  name: scenario.name,
  reachId: scenario.reachId,
  peakInflow: scenario.peakInflow,
  faultCount: scenario.faultCount,
  runCount,
  version: scenario.version,
  updatedAt: scenario.updatedAt.toISOString(),
  updatedBy: scenario.updater!.name,
});

export const presentScenario = (
  scenario: ScenarioModel,
  runCount: number,
  sections: Section[],
  system: UnitSystem,
): Scenario => ({
  ...presentScenarioRow(scenario, runCount),
  studyId: scenario.studyId,
  body: scenario.body,
  ...checkScenario(scenario.body, sections, system),
  proposals: proposals(sections, scenario.body.upstream, system),
});
