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

export const TOLERANCE_SOURCE =
  'Tolerances: ±0.30 m for good marks and ±0.15 m for the stage of gauges are common practice; fair (±0.50 m) and poor (±1.00 m) marks and the flow of gauges (±10 % of the observed peak) are allowed what is usual for them.';
