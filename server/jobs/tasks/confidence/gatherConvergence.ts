import {
  gridConvergence,
  type GridConvergence,
} from '../../../../shared/confidence/gridConvergence';
import { quantile } from '../../../../shared/confidence/quantile';
import type {
  ConfidenceInput,
  ConfidencePayload,
  ConvergenceResult,
  GridRow,
  MemberSummary,
  PlaceValues,
} from '../../../../shared/confidence/types';
import type { GatheredMember } from '../taskKind';

type Member = GatheredMember<ConfidencePayload, MemberSummary>;

/** Observed order, extrapolated value and grid convergence index at the stations and along the reach. */
export function gatherConvergence(members: Member[], input: ConfidenceInput): ConvergenceResult {
  const grids = members.map(({ result }) => result);
  const [fine, next] = grids.filter((grid): grid is MemberSummary => grid !== null);
  if (!next) throw new Error('Two grids at least must come to a result to be compared.');
  const row = (value: (grid: MemberSummary) => number | null) => gridRow(grids, value);
  const at = (s: number, key: keyof PlaceValues) => row(({ stations }) => stations[s][key]);
  const along = input.places.map((_, p) => row((grid) => grid.along.peakStage[p]));
  const difference = input.places.map((_, p) => next.along.peakStage[p] - fine.along.peakStage[p]);
  const most = difference.reduce(
    (found, value, p) => (Math.abs(value) > Math.abs(difference[found]) ? p : found),
    0,
  );
  const orders = along.flatMap(({ convergence }) =>
    convergence?.kind === 'monotone' && convergence.order !== null ? [convergence.order] : [],
  );
  return {
    kind: 'convergence',
    grids: grids.map((grid) => ({
      cellSize: grid?.cellSize ?? null,
      cells: grid?.cells ?? null,
      seconds: grid?.seconds ?? null,
    })),
    stations: input.stations.map((station, s) => ({
      ...station,
      peakStage: at(s, 'peakStage'),
      peakFlow: at(s, 'peakFlow'),
      arrival: at(s, 'arrival'),
    })),
    along: {
      chainage: input.places,
      bed: fine.along.bed,
      peakStage: fine.along.peakStage,
      difference,
      band: along.map(({ band }) => band),
      order: orders.length > 0 ? quantile(Float64Array.from(orders).sort(), 0.5) : null,
      monotone: orders.length / along.length,
    },
    widest: { chainage: input.places[most], difference: difference[most] },
  };
}

function gridRow(
  grids: (MemberSummary | null)[],
  value: (grid: MemberSummary) => number | null,
): GridRow {
  const values = grids.map((grid) => grid && value(grid));
  const known = values.every((one): one is number => one !== null);
  const convergence = known ? converge(values, grids as MemberSummary[]) : null;
  const { gciFine = null } = convergence ?? {};
  return { values, convergence, band: gciFine === null ? null : gciFine * Math.abs(values[0]!) };
}

const converge = (values: number[], grids: MemberSummary[]): GridConvergence =>
  gridConvergence(
    values as [number, number, number],
    grids.map(({ cellSize }) => cellSize) as [number, number, number],
  );
