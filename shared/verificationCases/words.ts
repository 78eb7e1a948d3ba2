import type { CaseGroup, Criterion, ErrorNorms, Measure } from './types';
import { isOrder } from './isWithin';

export const GROUP_WORDS: Record<CaseGroup, string> = {
  still: 'Still water',
  dam: 'A dam gone at once',
  states: 'Two states side by side',
  steady: 'Steady flow',
  waves: 'Waves, shores and pools',
};

export const MEASURE_WORDS: Record<Measure, string> = {
  stageL1: 'Mean difference of stage',
  stageMax: 'Largest difference of stage',
  flowL1: 'Mean difference of flow',
  flowMax: 'Largest difference of flow',
  stageOrder: 'Order of stage, two finest grids',
  flowOrder: 'Order of flow, two finest grids',
  jumpShift: 'Jump out of place',
  volume: 'Water lost or made',
};

const MEASURE_UNITS: Record<Measure, string> = {
  stageL1: 'm',
  stageMax: 'm',
  flowL1: 'm³/s',
  flowMax: 'm³/s',
  stageOrder: '',
  flowOrder: '',
  jumpShift: 'cells',
  volume: 'of all water',
};

export const NORM_WORDS: Record<keyof ErrorNorms, string> = {
  l1: 'L1',
  l2: 'L2',
  max: 'L∞',
};

const RAISED = [...'⁰¹²³⁴⁵⁶⁷⁸⁹'];
const raised = (power: number) =>
  `${power < 0 ? '⁻' : ''}${[...String(Math.abs(power))].map((digit) => RAISED[Number(digit)]).join('')}`;

/** An error with three digits: `0.00754`, or `5.12 × 10⁻⁵` where it is small. */
export function formatError(value: number | null): string {
  if (value === null) return '–';
  if (value === 0) return '0';
  if (Math.abs(value) >= 1e-3 && Math.abs(value) < 1e5) {
    const decimals = Math.max(0, 2 - Math.floor(Math.log10(Math.abs(value))));
    return value.toFixed(decimals);
  }
  const [digits, power] = value.toExponential(2).split('e');
  return `${digits} × 10${raised(Number(power))}`;
}

export const formatOrder = (order: number | null): string =>
  order === null ? '–' : order.toFixed(2).replace('-', '−');

/** `0.00754 m`. */
export function measuredText({ measure, value }: Criterion): string {
  if (value === null) return 'not measurable';
  if (measure === 'volume' && value === 0) return 'none';
  return withUnit(measure, value);
}

/** `at most 0.0095 m`. */
export const boundText = ({ measure, bound }: Criterion): string =>
  `${isOrder(measure) ? 'at least' : 'at most'} ${withUnit(measure, bound)}`;

function withUnit(measure: Measure, value: number): string {
  const number = isOrder(measure) ? formatOrder(value) : formatError(value);
  return `${number} ${MEASURE_UNITS[measure]}`.trim();
}

/** Chainage in m, time in s: the cases are as small as a flume and as long as a river. */
export const placeText = (along: 'chainage' | 'time', at: number): string =>
  along === 'time' ? `${at.toFixed(0)} s` : `${Number(at.toPrecision(6))} m`;
