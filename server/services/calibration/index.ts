import type { Platform } from '../../platform';
import type { ObservationsService } from '../observations';
import type { buildRuns } from '../runs';
import { buildReadResiduals } from './readResiduals';

interface Needs {
  observations: ObservationsService;
  runs: ReturnType<typeof buildRuns>;
}

/** Runs against what was observed, and the search for the roughness that fits best. */
export function buildCalibration(platform: Platform, needs: Needs) {
  return { residuals: buildReadResiduals(platform, needs) };
}

export type CalibrationService = ReturnType<typeof buildCalibration>;
