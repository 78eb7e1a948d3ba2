import { checkScenario } from '../../../shared/scenarios/checkScenario';
import type { ScenarioBody } from '../../../shared/scenarios/schemas';
import type { Section } from '../../../shared/surveys/types';

export const countFaults = (body: ScenarioBody, sections: readonly Section[]): number =>
  checkScenario(body, sections).faults.length;
