import { formatWithUnit } from '../units/format';
import type { UnitSystem } from '../units/units';
import type { MarkConfidence, MarkKind } from './types';

export const MARK_KINDS = ['debris', 'stain', 'eyewitness', 'gaugePeak', 'other'] as const;
export const MARK_CONFIDENCES = ['good', 'fair', 'poor'] as const;

export const KIND_WORDS: Record<MarkKind, string> = {
  debris: 'Debris line',
  stain: 'Stain',
  eyewitness: 'Eyewitness',
  gaugePeak: 'Peak of a gauge',
  other: 'Other',
};
export const CONFIDENCE_WORDS: Record<MarkConfidence, string> = {
  good: 'Good',
  fair: 'Fair',
  poor: 'Poor',
};

/**
 * What a confidence means: the residual that such a mark leaves to a model that fits, m. ±0.3 m for good marks is common
 * practice; fair and poor ones are allowed more here so that they weigh less, by the square of the ratio.
 */
export const MARK_TOLERANCE: Record<MarkConfidence, number> = { good: 0.3, fair: 0.5, poor: 1 };

/** Stage of a gauge within ±0.15 m: common practice. */
export const GAUGE_STAGE_TOLERANCE = 0.15;
/** Flow of a gauge within ±10 % of its observed peak: what a rating curve is trusted with in flood, common practice. */
export const GAUGE_FLOW_TOLERANCE = 0.1;

/** Where the tolerances come from, in the study's units. */
export function toleranceSource(system: UnitSystem): string {
  const within = (metres: number) => `±${formatWithUnit(metres, 'depth', system)}`;
  return (
    `Tolerances: ${within(MARK_TOLERANCE.good)} for good marks and ${within(GAUGE_STAGE_TOLERANCE)} for the stage of gauges are common practice; ` +
    `fair (${within(MARK_TOLERANCE.fair)}) and poor (${within(MARK_TOLERANCE.poor)}) marks are allowed more, and the flow of gauges ±${100 * GAUGE_FLOW_TOLERANCE} % of the observed peak.`
  );
}
