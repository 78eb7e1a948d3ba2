import { inverseNormal } from './inverseNormal';

export const DISTRIBUTION_KINDS = ['lognormal', 'normal', 'triangular', 'uniform'] as const;
export type DistributionKind = (typeof DISTRIBUTION_KINDS)[number];

/** How a factor or a shift is spread. */
export type Distribution =
  | { kind: 'normal'; mean: number; deviation: number }
  /** `spread` is the geometric standard deviation, > 1: 68 % lie between median / spread and median × spread. */
  | { kind: 'lognormal'; median: number; spread: number }
  | { kind: 'triangular'; low: number; mode: number; high: number }
  | { kind: 'uniform'; low: number; high: number };

/** The unbounded ones are cut at these probabilities, so that no member is absurd. */
export const CUT = 1e-4;

/** The value with probability p below it, 0 <= p <= 1. */
export function valueAt(distribution: Distribution, p: number): number {
  switch (distribution.kind) {
    case 'normal':
      return distribution.mean + distribution.deviation * inverseNormal(cut(p));
    case 'lognormal':
      return distribution.median * distribution.spread ** inverseNormal(cut(p));
    case 'uniform':
      return distribution.low + p * (distribution.high - distribution.low);
    case 'triangular': {
      const { low, mode, high } = distribution;
      const width = high - low;
      const atMode = (mode - low) / width;
      return p < atMode
        ? low + Math.sqrt(p * width * (mode - low))
        : high - Math.sqrt((1 - p) * width * (high - mode));
    }
  }
}

const cut = (p: number): number => Math.min(1 - CUT, Math.max(CUT, p));

/** A distribution of another kind that is about as wide, to begin with; three significant digits. */
export function asKind(distribution: Distribution, kind: DistributionKind): Distribution {
  if (distribution.kind === kind) return distribution;
  const at = (p: number) => Number(valueAt(distribution, p).toPrecision(3));
  switch (kind) {
    case 'normal':
      return {
        kind,
        mean: at(0.5),
        deviation: Number(((at(0.841) - at(0.159)) / 2).toPrecision(3)),
      };
    case 'lognormal':
      return {
        kind,
        median: at(0.5),
        spread: Number(Math.sqrt(at(0.841) / at(0.159)).toPrecision(3)),
      };
    case 'triangular':
      return { kind, low: at(0.025), mode: at(0.5), high: at(0.975) };
    case 'uniform':
      return { kind, low: at(0.05), high: at(0.95) };
  }
}

/** What is wrong with the numbers of a distribution; null: nothing. A factor must stay above 0. */
export function distributionFault(
  distribution: Distribution,
  measure: 'factor' | 'metres',
): string | null {
  switch (distribution.kind) {
    case 'normal':
      if (!(distribution.deviation > 0)) return 'The standard deviation must be above 0.';
      break;
    case 'lognormal':
      if (measure === 'metres') return 'A shift is not lognormal: it may be below 0.';
      if (!(distribution.median > 0)) return 'The median must be above 0.';
      if (!(distribution.spread > 1))
        return 'The geometric standard deviation must be above 1, e.g. 1.2.';
      break;
    case 'uniform':
      if (!(distribution.low < distribution.high)) return 'The lower end must be below the upper.';
      break;
    case 'triangular': {
      const { low, mode, high } = distribution;
      if (!(low <= mode && mode <= high && low < high))
        return 'The most likely value must lie between the lower and the upper end.';
    }
  }
  if (measure === 'factor' && !(valueAt(distribution, 0) > 0))
    return 'Some members would get a factor of 0 or less. Narrow the spread, or use a lognormal distribution.';
  return null;
}
