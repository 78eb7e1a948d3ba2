import type { Platform } from '../../platform';
import type { buildRuns } from '../runs';
import type { buildTasks } from '../tasks';
import { buildConfidenceOptions } from './confidenceOptions';
import { buildRequestConfidence } from './requestConfidence';
import { confidenceCsv } from './confidenceCsv';
import { buildReadConfidence } from './readConfidence';

interface Needs {
  runs: ReturnType<typeof buildRuns>;
  tasks: ReturnType<typeof buildTasks>;
}

/** How far a run's numbers carry: convergence, sensitivity and ensembles of its frozen case. */
export function buildConfidence(_platform: Platform, needs: Needs) {
  const options = buildConfidenceOptions(needs.runs);
  return {
    options,
    request: buildRequestConfidence(needs),
    read: buildReadConfidence(needs.tasks),
    csv: confidenceCsv,
  };
}
