import { validateCase } from '../../../../shared/case/validateCase';
import type { ResultFile } from '../../../../shared/case/resultFile';
import type {
  ConfidenceInput,
  ConfidencePayload,
  MemberSummary,
  PlaceValues,
} from '../../../../shared/confidence/types';
import { varyCase } from '../../../../shared/confidence/varyCase';
import { partsOf, q, say } from '../../../../shared/units/message';
import { SaidError } from '../../../../shared/units/SaidError';
import { mergePlaces } from '../../../results/blocks/mergePlaces';
import { peaksAt } from '../../../results/peaksAt';
import { routeCase } from '../../../solvers';
import type { TaskControl } from '../taskKind';
import { recordStations } from './recordStations';

/** Routes one member and keeps its peaks, and its hydrographs at the stations where the set wants them. */
export function computeMember(
  { variation }: ConfidencePayload,
  { caseFile, stations, places, series }: ConfidenceInput,
  { shouldStop, onProgress }: TaskControl,
): MemberSummary {
  const varied = varyCase(caseFile, variation);
  const { faults } = validateCase(varied);
  if (faults.length > 0) {
    const { path, ...said } = faults[0];
    throw new SaidError(say`The varied case cannot be routed: ${path}: ${partsOf(said)}`);
  }
  const recorder = series ? recordStations(varied, stations) : null;
  const result = routeCase(varied, {
    shouldStop,
    onProgress: ({ fraction }) => onProgress(fraction),
    ...(recorder && { onOutput: recorder.add }),
  });
  const valuesAt = peaksOf(varied.sections, result);
  const along = places.map(valuesAt);
  const cells = result.cells.chainage.length;
  const { sections } = varied;
  return {
    cells,
    cellSize: (sections[sections.length - 1].chainage - sections[0].chainage) / cells,
    seconds: result.seconds,
    volumeError: result.volume.relativeError,
    warnings: result.warnings.length,
    stations: stations.map(({ chainage }) => {
      const { bed: _bed, ...values } = valuesAt(chainage);
      return values;
    }),
    along: {
      bed: along.map(({ bed }) => bed),
      peakStage: along.map(({ peakStage }) => peakStage),
      peakFlow: along.map(({ peakFlow }) => peakFlow),
      arrival: along.map(({ arrival }) => arrival),
    },
    series: recorder && { times: result.times, ...recorder.series(result) },
  };
}

/** As a run tells its peaks: exact at a surveyed section, linear between neighbouring places elsewhere. */
function peaksOf(
  sections: Parameters<typeof mergePlaces>[0],
  result: ResultFile,
): (chainage: number) => PlaceValues & { bed: number } {
  const merged = mergePlaces(sections, result);
  return (chainage) => {
    const peaks = peaksAt(merged, null, chainage);
    if (!peaks) throw new SaidError(say`Chainage ${q(chainage, 'chainage')} is not on the reach.`);
    const { bed, peakStage, peakFlow, arrival } = peaks;
    return { bed, peakStage, peakFlow, arrival };
  };
}
