import { PARAMETERS, type ParameterKey } from '../../../shared/confidence/parameters';
import type {
  BandSeries,
  ConfidenceResult,
  ConvergenceResult,
  EnsembleResult,
  GridRow,
  PlaceValues,
  SensitivityResult,
} from '../../../shared/confidence/types';
import type { UnitSystem } from '../../../shared/units/units';
import { csvLine } from '../../results/exports/csvField';
import { EXPORT_UNITS } from '../../results/exports/exportUnits';

/** `members`: of an ensemble, what each member was given and came to, instead of the bands. */
export type ConfidencePart = 'result' | 'members';
type Field = string | number | null;
type Line = Field[];

interface Scale {
  length: (si: number | null) => number | null;
  flow: (si: number | null) => number | null;
  m: string;
  q: string;
}

/** The tables behind the result of a set, in the study's units; metric ones exactly as computed. */
export function confidenceCsv(
  result: ConfidenceResult,
  unitSystem: UnitSystem,
  part: ConfidencePart = 'result',
): string {
  const { length, flow } = EXPORT_UNITS[unitSystem];
  const scale: Scale = {
    length: (si) => si && si / length.si,
    flow: (si) => si && si / flow.si,
    m: length.symbol,
    q: flow.symbol,
  };
  return linesOf(result, scale, part).map(csvLine).join('');
}

function linesOf(result: ConfidenceResult, scale: Scale, part: ConfidencePart): Line[] {
  switch (result.kind) {
    case 'convergence':
      return convergenceLines(result, scale);
    case 'sensitivity':
      return sensitivityLines(result, scale);
    case 'ensemble':
      return part === 'members' ? memberLines(result, scale) : bandLines(result, scale);
  }
}

/** A factor as it is, a shift in the unit of lengths. */
const valueOf = (key: ParameterKey, value: number | null, s: Scale): number | null =>
  PARAMETERS[key].measure === 'factor' ? value : s.length(value);

function convergenceLines({ grids, stations, along }: ConvergenceResult, s: Scale): Line[] {
  const head = [
    'place',
    `chainage (${s.m})`,
    'quantity',
    'unit',
    ...grids.map(
      ({ cellSize }, k) =>
        `grid ${k + 1}: ${cellSize === null ? 'failed' : `${Number(s.length(cellSize)!.toPrecision(6))} ${s.m}`}`,
    ),
    'observed order (-)',
    'extrapolated',
    'half width of the band',
    'kind of convergence',
  ];
  const line = (
    name: string,
    chainage: number,
    quantity: string,
    unit: string,
    { values, convergence, band }: GridRow,
    to: (si: number | null) => number | null,
  ): Line => [
    name,
    s.length(chainage),
    quantity,
    unit,
    ...values.map(to),
    convergence?.order ?? null,
    to(convergence?.extrapolated ?? null),
    to(band),
    convergence?.kind ?? null,
  ];
  const seconds = (si: number | null) => si;
  return [
    head,
    ...stations.flatMap(({ name, chainage, peakStage, peakFlow, arrival }) => [
      line(name, chainage, 'peak stage', s.m, peakStage, s.length),
      line(name, chainage, 'peak flow', s.q, peakFlow, s.flow),
      line(name, chainage, 'arrival', 's', arrival, seconds),
    ]),
    ...along.chainage.map((chainage, p) => [
      'along the reach',
      s.length(chainage),
      'peak stage',
      s.m,
      s.length(along.peakStage[p]),
      s.length(along.peakStage[p] + along.difference[p]),
      null,
      null,
      null,
      s.length(along.band[p]),
      null,
    ]),
  ];
}

function sensitivityLines({ base, rows, stations }: SensitivityResult, s: Scale): Line[] {
  const values = (of: PlaceValues | null): Field[] =>
    of ? [s.length(of.peakStage), s.flow(of.peakFlow), of.arrival] : [null, null, null];
  const line = (
    k: number,
    parameter: string,
    value: number | null,
    of: PlaceValues | null,
  ): Line => {
    const stage = of && of.peakStage - base[k].peakStage;
    const flow = of && of.peakFlow - base[k].peakFlow;
    const arrival =
      of && of.arrival !== null && base[k].arrival !== null ? of.arrival - base[k].arrival : null;
    const place: Field[] = [stations[k].name, s.length(stations[k].chainage)];
    return [...place, parameter, value, ...values(of), s.length(stage), s.flow(flow), arrival];
  };
  return [
    [
      'station',
      `chainage (${s.m})`,
      'input',
      `factor, or shift (${s.m})`,
      `peak stage (${s.m})`,
      `peak flow (${s.q})`,
      'arrival (s)',
      `change of peak stage (${s.m})`,
      `change of peak flow (${s.q})`,
      'change of arrival (s)',
    ],
    ...stations.flatMap((_, k) => [
      line(k, 'base case', null, base[k]),
      ...rows.flatMap(({ parameter, low, high }) =>
        [low, high].map((side) =>
          line(
            k,
            PARAMETERS[parameter].label,
            valueOf(parameter, side.value, s),
            side.stations?.[k] ?? null,
          ),
        ),
      ),
    ]),
  ];
}

function bandLines({ stations, times, along }: EnsembleResult, s: Scale): Line[] {
  const three = (
    { p5, p50, p95 }: BandSeries,
    k: number,
    to: (si: number | null) => number | null,
  ) => [to(p5[k]), to(p50[k]), to(p95[k])];
  return [
    ['place', `chainage (${s.m})`, 'time (s)', 'quantity', 'unit', '5 %', '50 %', '95 %'],
    ...stations.flatMap(({ name, chainage, stage, flow }) =>
      times.flatMap((time, k) => [
        [name, s.length(chainage), time, 'stage', s.m, ...three(stage, k, s.length)],
        [name, s.length(chainage), time, 'flow', s.q, ...three(flow, k, s.flow)],
      ]),
    ),
    ...along.chainage.map((chainage, p) => [
      'along the reach',
      s.length(chainage),
      null,
      'peak stage',
      s.m,
      ...three(along.peakStage, p, s.length),
    ]),
  ];
}

function memberLines({ drawn, stations }: EnsembleResult, s: Scale): Line[] {
  const keys = Object.keys(PARAMETERS).filter((key) =>
    drawn.some(({ variation }) => variation[key as ParameterKey] !== undefined),
  ) as ParameterKey[];
  return [
    [
      'member',
      ...keys.map((key) => {
        const { label, measure } = PARAMETERS[key];
        return `${label} (${measure === 'factor' ? 'factor' : `shift, ${s.m}`})`;
      }),
      ...stations.flatMap(({ name }) => [
        `${name}: peak stage (${s.m})`,
        `${name}: peak flow (${s.q})`,
        `${name}: arrival (s)`,
      ]),
    ],
    ...drawn.map(({ index, variation }, k) => [
      index,
      ...keys.map((key) => valueOf(key, variation[key] ?? null, s)),
      ...stations.flatMap(({ peakStages, peakFlows, arrivals }) => [
        s.length(peakStages[k]),
        s.flow(peakFlows[k]),
        arrivals[k],
      ]),
    ]),
  ];
}
