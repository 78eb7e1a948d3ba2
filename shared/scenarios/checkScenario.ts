import type { Fault } from '../errors';
import type { Section } from '../surveys/types';
import { checkDownstream } from './checks/checkDownstream';
import { checkInitial } from './checks/checkInitial';
import { checkLaterals } from './checks/checkLaterals';
import { checkLocalLosses } from './checks/checkLocalLosses';
import { checkNumerics } from './checks/checkNumerics';
import { checkRoughness } from './checks/checkRoughness';
import { checkReachOf } from './checks/checkReachOf';
import { checkStructures } from './checks/checkStructures';
import { checkUpstream } from './checks/checkUpstream';
import { Findings } from './checks/Findings';
import { reachFacts } from './checks/reachFacts';
import type { ScenarioBody } from './schemas';
import type { UnitSystem } from '../units/units';

/**
 * What keeps a scenario from being routed on these sections (faults) and what a careful person would look at (doubts), each
 * at its path in the body, told in the units of the study. Pure: the form uses it as one types, the server before a run. Covers all that the solver would refuse.
 */
export function checkScenario(
  body: ScenarioBody,
  sections: readonly Section[],
  system: UnitSystem = 'metric',
): { faults: Fault[]; doubts: Fault[] } {
  const findings = new Findings(system);
  if (!body.name.trim()) findings.fault('name', 'Name the scenario.');
  checkReachOf(sections, findings);
  if (sections.length >= 2) {
    const reach = reachFacts(sections);
    checkUpstream(body, reach, findings);
    checkLaterals(body, reach, findings);
    checkStructures(body, reach, findings);
    checkRoughness(body, reach, findings);
    checkLocalLosses(body, reach, findings);
    checkDownstream(body, reach, findings);
    checkInitial(body, reach, findings);
    checkNumerics(body, reach, findings);
  }
  return { faults: findings.faults, doubts: findings.doubts };
}
