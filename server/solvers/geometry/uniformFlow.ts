import { CASE_DEFAULTS, type SectionInput } from '../../../shared/case/caseFile';
import { sectionProperties, sectionShape } from './sectionProperties';
import type { SectionShape } from './sectionShape';

/** Highest depth (m) that is looked at. */
const DEEPEST = 1e4;

/**
 * Normal depth (m above the lowest bed) of `flow` (m³/s) on `slope`: K(y) √S = Q. Null without friction, or where
 * flow or slope is not positive.
 */
export function normalDepth(
  section: SectionInput | SectionShape,
  flow: number,
  slope: number,
): number | null {
  const shape = 'zone' in section ? section : sectionShape(section);
  if (!(flow > 0) || !(slope > 0) || shape.zoneN.every((n) => n === 0)) return null;
  const needed = flow / Math.sqrt(slope);
  const excess = (y: number): number => sectionProperties(shape, shape.bed + y).conveyance - needed;
  return lowestRoot(excess, firstReach(excess));
}

/**
 * Critical depth (m above the lowest bed) of `flow` (m³/s): Q² B = g A³. Where a compound section has several, the one
 * of least specific energy. Null where the flow is not positive.
 */
export function criticalDepth(
  section: SectionInput | SectionShape,
  flow: number,
  gravity: number = CASE_DEFAULTS.gravity,
): number | null {
  const shape = 'zone' in section ? section : sectionShape(section);
  if (!(flow > 0)) return null;
  const excess = (y: number): number => {
    const { area, topWidth } = sectionProperties(shape, shape.bed + y);
    return topWidth > 0 ? (gravity * area ** 3) / topWidth - flow * flow : -flow * flow;
  };
  const energy = (y: number): number =>
    y + flow ** 2 / (2 * gravity * sectionProperties(shape, shape.bed + y).area ** 2);
  // The width of a compound section can bend the curve back over any elevation of the survey.
  const nodes = [...shape.z].map((z) => z - shape.bed).filter((y) => y > 0);
  const top = Math.max(firstReach(excess), ...nodes);
  const marks = [0, ...nodes.sort((a, b) => a - b).flatMap((y) => [y - 1e-9, y + 1e-9]), top];
  let best: number | null = null;
  for (let k = 0; k + 1 < marks.length; k++) {
    if (excess(marks[k]) >= 0 || excess(marks[k + 1]) < 0) continue;
    const y = lowestRoot(excess, marks[k + 1], marks[k]);
    if (best === null || energy(y) < energy(best)) best = y;
  }
  return best;
}

function firstReach(excess: (y: number) => number): number {
  let y = 0.01;
  while (excess(y) < 0 && y < DEEPEST) y *= 2;
  return y;
}

/** Bisection: excess(lo) < 0 <= excess(hi). */
function lowestRoot(excess: (y: number) => number, hi: number, lo = 0): number {
  for (let k = 0; k < 100 && hi - lo > 1e-13 * hi; k++) {
    const mid = 0.5 * (lo + hi);
    if (excess(mid) < 0) lo = mid;
    else hi = mid;
  }
  return 0.5 * (lo + hi);
}
