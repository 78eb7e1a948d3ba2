import type { Platform } from '../../platform';
import type { ObservationsService } from '../observations';
import type { buildRuns } from '../runs';
import type { ScenariosService } from '../scenarios/scenarios';
import type { buildTasks } from '../tasks';
import { buildReadResiduals } from './readResiduals';
import { buildRequestSearch } from './requestSearch';
import { buildScenarioOfSearch } from './scenarioOfSearch';

interface Needs {
  observations: ObservationsService;
  runs: ReturnType<typeof buildRuns>;
  scenarios: ScenariosService;
  tasks: ReturnType<typeof buildTasks>;
}

/** Runs against what was observed, and the search for the roughness that fits best. */
export function buildCalibration(platform: Platform, needs: Needs) {
  return {
    residuals: buildReadResiduals(platform, needs),
    search: buildRequestSearch(needs),
    scenarioOf: buildScenarioOfSearch(platform, needs),
  };
}

export type CalibrationService = ReturnType<typeof buildCalibration>;
