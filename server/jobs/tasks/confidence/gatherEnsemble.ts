import { bandOf, type Band } from '../../../../shared/confidence/quantile';
import type {
  BandSeries,
  ConfidenceInput,
  ConfidencePayload,
  EnsembleResult,
  MemberSummary,
} from '../../../../shared/confidence/types';
import type { GatheredMember } from '../taskKind';

type Member = GatheredMember<ConfidencePayload, MemberSummary>;
type Routed = Member & { result: MemberSummary };

/** Bands on the hydrographs and on the long section, and what each member came to at the stations. */
export function gatherEnsemble(members: Member[], input: ConfidenceInput): EnsembleResult {
  const draws = members.filter(({ payload }) => payload.role.kind === 'draw');
  const routed = draws.filter((member): member is Routed => member.result !== null);
  if (routed.length < 2) throw new Error('Fewer than two members came to a result: no band.');
  const base = members.find(({ payload }) => payload.role.kind === 'base')?.result ?? null;
  const results = routed.map(({ result }) => result);
  const [first] = results;
  const times = first.series?.times ?? [];
  /** Over the members, at each of so many moments or places. */
  const bands = (count: number, value: (member: MemberSummary, k: number) => number) =>
    seriesOf(
      Array.from({ length: count }, (_, k) => bandOf(results.map((result) => value(result, k)))),
    );
  return {
    kind: 'ensemble',
    cellSize: first.cellSize,
    members: routed.length,
    failed: draws.length - routed.length,
    drawn: routed.map(({ index, payload }) => ({ index, variation: payload.variation })),
    times,
    stations: input.stations.map((station, s) => ({
      ...station,
      base: base?.stations[s] ?? null,
      stage: bands(times.length, ({ series }, k) => series!.stage[s][k]),
      flow: bands(times.length, ({ series }, k) => series!.flow[s][k]),
      peakStages: results.map(({ stations }) => stations[s].peakStage),
      peakFlows: results.map(({ stations }) => stations[s].peakFlow),
      arrivals: results.map(({ stations }) => stations[s].arrival),
    })),
    along: {
      chainage: input.places,
      bed: first.along.bed,
      base: base?.along.peakStage ?? null,
      peakStage: bands(input.places.length, ({ along }, p) => along.peakStage[p]),
    },
  };
}

const seriesOf = (bands: Band[]): BandSeries => ({
  p5: bands.map(({ p5 }) => p5),
  p50: bands.map(({ p50 }) => p50),
  p95: bands.map(({ p95 }) => p95),
});
