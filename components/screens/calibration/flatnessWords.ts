import type { Flatness } from '@/shared/calibration/search/types';
import { formatNumber } from '@/shared/units/format';

/** `0.92 to 1.31`; an open end says that it goes on beyond what was tried. */
export function rangeWords({ range }: Flatness): string {
  if (!range) return '–';
  const low = `${range.lowOpen ? '≤ ' : ''}${formatNumber(range.low, 2)}`;
  const high = `${range.highOpen ? '≥ ' : ''}${formatNumber(range.high, 2)}`;
  return `${low} to ${high}`;
}

/** Wider than this, relative to the best, the observations hardly tell. */
const WIDE = 0.4;

/** Whether the observations tell this multiplier. */
export function flatnessWords({ range, curvature }: Flatness, best: number): string {
  if (!range) return 'Too few runs succeeded to tell how flat the optimum is.';
  const width = (range.high - range.low) / best;
  const open = range.lowOpen || range.highOpen;
  const verdict =
    open || width > WIDE
      ? 'Flat: the observations hardly tell this multiplier, and another one nearby is as good.'
      : width > WIDE / 2
        ? 'Moderately sharp: the observations tell it roughly.'
        : 'Sharp: the observations tell it well.';
  const bend =
    curvature === null ? '' : ` Curvature of the squared misfit ${formatNumber(curvature, 1)}.`;
  return `${verdict}${bend}`;
}
