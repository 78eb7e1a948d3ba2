import type { CaseFile } from '../../../shared/case/caseFile';
import { parametersOf } from '../../../shared/confidence/parameters';
import type { ConfidenceOptions } from '../../../shared/confidence/types';
import type { RunModel } from '../../models/Run';
import type { buildRuns } from '../runs';

export const buildConfidenceOptions =
  ({ exports, results }: ReturnType<typeof buildRuns>) =>
  /** What can be varied of a run. Throws `conflict` where it is not routed. */
  async (run: RunModel): Promise<ConfidenceOptions> => {
    const summary = await results.summary(run);
    const caseFile = JSON.parse((await exports.caseFile(run)).toString('utf8')) as CaseFile;
    const { cellCount, cellSize, seconds, stations } = summary;
    return {
      runNumber: run.number,
      cellSize,
      cells: cellCount,
      length: cellCount * cellSize,
      seconds,
      stations: stations.map(({ stationId, name, chainage }) => ({ stationId, name, chainage })),
      parameters: parametersOf(caseFile),
    };
  };
