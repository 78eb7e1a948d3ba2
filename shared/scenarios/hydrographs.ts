import { NRCS_ORDINATES } from './nrcsHydrograph';
import type { Upstream } from './schemas';

export interface FlowSeries {
  /** s. */
  times: number[];
  /** m³/s. */
  flows: number[];
}

export type GeneratedInflow = Extract<Upstream, { kind: 'generated' }>;

/** Recession over rise of the triangle that stands for the NRCS unit hydrograph (NEH 630, chapter 16). */
export const SCS_RECESSION_RATIO = 1.67;
/** Close to the NRCS unit hydrograph with its peak rate factor of 484 (NEH 630, chapter 16; value common practice). */
export const USUAL_GAMMA_EXPONENT = 3.7;

/** Points of the gamma shape on its rise; its recession is cut off where it is this share of the peak. */
const GAMMA_STEPS_TO_PEAK = 25;
const GAMMA_CUT = 1e-3;
const GAMMA_MAX_POINTS = 2000;

/**
 * The flood that a generated inflow means: base flow + (peak − base flow) × shape(t/Tp), exact at its points and linear between.
 * null while a number is missing or cannot be. Times in s, flows in m³/s.
 */
export function generateHydrograph(inflow: GeneratedInflow): FlowSeries | null {
  const { baseFlow, peakFlow, timeToPeak } = inflow;
  if (baseFlow === null || peakFlow === null || timeToPeak === null) return null;
  if (!(timeToPeak > 0) || !(peakFlow >= baseFlow) || baseFlow < 0) return null;
  const shape = shapeOf(inflow);
  if (!shape) return null;
  return {
    times: shape.map(([t]) => t * timeToPeak),
    flows: shape.map(([, q]) => baseFlow + (peakFlow - baseFlow) * q),
  };
}

function shapeOf(inflow: GeneratedInflow): readonly (readonly [number, number])[] | null {
  if (inflow.shape === 'nrcs') return NRCS_ORDINATES;
  if (inflow.shape === 'triangle') {
    const ratio = inflow.recessionRatio ?? SCS_RECESSION_RATIO;
    return ratio > 0
      ? [
          [0, 0],
          [1, 1],
          [1 + ratio, 0],
        ]
      : null;
  }
  return gammaShape(inflow.gammaExponent ?? USUAL_GAMMA_EXPONENT);
}

/** q = τ^m exp(m (1 − τ)), τ = t/Tp: 1 at τ = 1, with m the steepness. */
function gammaShape(m: number): [number, number][] | null {
  if (!(m > 0)) return null;
  const shape: [number, number][] = [];
  for (let i = 0; i < GAMMA_MAX_POINTS; i++) {
    const t = i / GAMMA_STEPS_TO_PEAK;
    const q = t ** m * Math.exp(m * (1 - t));
    if (t > 1 && q < GAMMA_CUT) break;
    shape.push([t, q]);
  }
  return [...shape, [shape.length / GAMMA_STEPS_TO_PEAK, 0]];
}

/** The inflow of an upstream end of any kind, of a reservoir into it; null where it is no inflow or not complete. */
export function inflowOf(upstream: Upstream): FlowSeries | null {
  if (upstream.kind === 'generated') return generateHydrograph(upstream);
  if (upstream.kind === 'reservoir') return inflowOf(upstream.inflow);
  if (upstream.kind !== 'table' || upstream.times.length === 0) return null;
  return { times: upstream.times, flows: upstream.flows };
}

/** Largest flow and when it first comes; null where there is none. */
export function peakOf(series: FlowSeries | null): { flow: number; time: number } | null {
  if (!series || series.flows.length === 0) return null;
  let at = 0;
  series.flows.forEach((flow, i) => {
    if (flow > series.flows[at]) at = i;
  });
  return { flow: series.flows[at], time: series.times[at] };
}

/** Volume between its first and its last time, m³ (exact: the series is linear between its points). */
export function volumeOf({ times, flows }: FlowSeries): number {
  let volume = 0;
  for (let i = 1; i < times.length; i++)
    volume += 0.5 * (flows[i] + flows[i - 1]) * (times[i] - times[i - 1]);
  return volume;
}
