import { bankfullWidth, thalwegOf } from '../reaches/sectionGeometry';
import type { Section } from '../surveys/types';
import { fromSi, toSi, type UnitSystem } from '../units/units';
import { inflowOf, SCS_RECESSION_RATIO, USUAL_GAMMA_EXPONENT } from './hydrographs';
import type { ScenarioBody, Upstream } from './schemas';
import type { Scenario } from './types';

type Sections = readonly Pick<Section, 'chainage' | 'points' | 'banks'>[];

const HOUR = 3600;
/** Cells between two sections, cells of a whole reach, and cells a channel width: enough for the wave, cheap to compute. */
const CELLS_PER_INTERVAL = 20;
const CELLS = { min: 50, max: 5000 };
const CELLS_PER_WIDTH = 5;
const ROUND_CELLS = [1, 2, 2.5, 5];
const DEFAULT_DURATION = 48 * HOUR;
/** A slow flood wave, m/s: what the outlet needs to see of the flood after the inflow has ended. */
const SLOW_WAVE = 1;
const OUTPUTS = 600;
const ROUND_INTERVALS = [1, 2, 5, 10, 15, 20, 30, 60, 120, 300, 600, 900, 1800, 3600, 7200, 21_600];
const SLOPES = { min: 1e-5, max: 0.2, fallback: 1e-4 };
/** Share of the reach above its outlet that tells the outlet's slope, and the sections it takes at least. */
const OUTLET_SHARE = 0.25;
const OUTLET_SECTIONS = 4;

/** What fits the reach and the inflow: the form starts from it. SI, round numbers in the units of the study. */
export function proposals(
  sections: Sections,
  upstream?: Upstream,
  system: UnitSystem = 'metric',
): Scenario['proposals'] {
  const length = sections[sections.length - 1].chainage - sections[0].chainage;
  const duration = durationFor(length, upstream);
  return {
    cellSize: cellSizeFor(sections, length, system),
    outletSlope: outletSlopeOf(sections),
    duration,
    outputInterval:
      ROUND_INTERVALS.find((interval) => duration / interval <= OUTPUTS) ??
      Math.ceil(duration / OUTPUTS / HOUR) * HOUR,
  };
}

/** A new scenario: everything but the flood itself is proposed. */
export function newScenario(
  name: string,
  reachId: number,
  sections: Sections,
  system: UnitSystem = 'metric',
): ScenarioBody {
  const { cellSize, outletSlope, duration, outputInterval } = proposals(
    sections,
    undefined,
    system,
  );
  return {
    name,
    reachId,
    startsAt: null,
    note: '',
    upstream: {
      kind: 'generated',
      shape: 'nrcs',
      baseFlow: null,
      peakFlow: null,
      timeToPeak: null,
      recessionRatio: SCS_RECESSION_RATIO,
      gammaExponent: USUAL_GAMMA_EXPONENT,
    },
    laterals: [],
    structures: [],
    roughnessFactors: [],
    localLosses: [],
    downstream: { kind: 'normalDepth', slope: outletSlope },
    initial: { kind: 'steady' },
    numerics: { cellSize, duration, outputInterval, order: 2, courant: null, dryDepth: null },
  };
}

/** Fine enough for the spacing of the sections, no finer than the width of the river can show. */
function cellSizeFor(sections: Sections, length: number, system: UnitSystem): number {
  const spacings = sections.slice(1).map(({ chainage }, i) => chainage - sections[i].chainage);
  const widths = sections.map(bankfullWidth);
  const wish = Math.max(median(spacings) / CELLS_PER_INTERVAL, median(widths) / CELLS_PER_WIDTH);
  const bounded = Math.min(Math.max(wish, length / CELLS.max), length / CELLS.min);
  return toSi(roundDown(fromSi(bounded, 'length', system)), 'length', system);
}

/** Fall of the thalweg over the lowest part of the reach, by least squares; of the whole reach where that does not fall. */
export function outletSlopeOf(sections: Sections): number {
  const last = sections[sections.length - 1].chainage;
  const from = last - OUTLET_SHARE * (last - sections[0].chainage);
  const lower = sections.filter(({ chainage }) => chainage >= from);
  const near = lower.length >= OUTLET_SECTIONS ? lower : sections.slice(-OUTLET_SECTIONS);
  const slope = [near, sections].map(fallOf).find((fall) => fall > 0) ?? SLOPES.fallback;
  return Number(Math.min(Math.max(slope, SLOPES.min), SLOPES.max).toPrecision(2));
}

function fallOf(sections: Sections): number {
  const n = sections.length;
  const meanX = sections.reduce((sum, { chainage }) => sum + chainage, 0) / n;
  const meanZ = sections.reduce((sum, section) => sum + thalwegOf(section), 0) / n;
  let sxz = 0;
  let sxx = 0;
  for (const section of sections) {
    sxz += (section.chainage - meanX) * (thalwegOf(section) - meanZ);
    sxx += (section.chainage - meanX) ** 2;
  }
  return -sxz / sxx;
}

function durationFor(length: number, upstream: Upstream | undefined): number {
  const inflow = upstream && inflowOf(upstream);
  if (!inflow) return DEFAULT_DURATION;
  const end = inflow.times[inflow.times.length - 1];
  return Math.max(1, Math.ceil((end + length / SLOW_WAVE) / HOUR)) * HOUR;
}

function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 ? sorted[middle] : 0.5 * (sorted[middle - 1] + sorted[middle]);
}

function roundDown(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value));
  const lead = ROUND_CELLS.filter((round) => round * power <= value * (1 + 1e-9)).at(-1) ?? 1;
  return lead * power;
}
