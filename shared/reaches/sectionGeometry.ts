import type { Section } from '../surveys/types';

/** What can be told of a section by its points alone. SI; pure, used on both sides. */

/** Lowest point, m. */
export const thalwegOf = ({ points }: Pick<Section, 'points'>): number =>
  points.reduce((low, [, z]) => Math.min(low, z), Infinity);

/**
 * Elevation of the ground at an offset (m); of a wall the higher end at its foot from outside. Beyond the ends: the end's.
 */
export function groundAt({ points }: Pick<Section, 'points'>, offset: number): number {
  const exact = points.filter(([y]) => y === offset);
  if (exact.length > 0) return Math.max(...exact.map(([, z]) => z));
  const next = points.findIndex(([y]) => y > offset);
  if (next === 0) return points[0][1];
  if (next < 0) return points[points.length - 1][1];
  const [[y0, z0], [y1, z1]] = [points[next - 1], points[next]];
  return z0 + ((z1 - z0) * (offset - y0)) / (y1 - y0);
}

/** Elevations at the bank marks, or at the section's ends where there are none: [left, right], m. */
export function bankLevels(section: Pick<Section, 'points' | 'banks'>): [number, number] {
  const { points, banks } = section;
  if (!banks) return [points[0][1], points[points.length - 1][1]];
  return [groundAt(section, banks[0]), groundAt(section, banks[1])];
}

/** Below the lower bank the water is in the channel, m. */
export const bankfullStage = (section: Pick<Section, 'points' | 'banks'>): number =>
  Math.min(...bankLevels(section));

/** Width of the water surface at a stage, between `from` and `to` (m) where given. */
export function topWidthAt(
  { points }: Pick<Section, 'points'>,
  stage: number,
  [from, to]: readonly [number, number] = [-Infinity, Infinity],
): number {
  let width = 0;
  for (let i = 1; i < points.length; i++) {
    const [[y0, z0], [y1, z1]] = [points[i - 1], points[i]];
    if (y1 <= y0) continue;
    const at = (z: number) => y0 + ((y1 - y0) * (z - z0)) / (z1 - z0);
    let [left, right] = [y0, y1];
    if (z0 > stage && z1 > stage) continue;
    if (z0 > stage) left = at(stage);
    if (z1 > stage) right = at(stage);
    width += Math.max(0, Math.min(right, to) - Math.max(left, from));
  }
  return width;
}

/** Area between the ground and a level (m²), between `from` and `to` (m) where given; ground above the level counts nothing. */
export function areaBelow(
  { points }: Pick<Section, 'points'>,
  level: number,
  [from, to]: readonly [number, number] = [-Infinity, Infinity],
): number {
  let area = 0;
  for (let i = 1; i < points.length; i++) {
    const [[y0, z0], [y1, z1]] = [points[i - 1], points[i]];
    const [left, right] = [Math.max(y0, from), Math.min(y1, to)];
    if (right <= left) continue;
    const depthAt = (y: number) => level - (z0 + ((z1 - z0) * (y - y0)) / (y1 - y0));
    area += wetted(depthAt(left), depthAt(right), right - left);
  }
  return area;
}

/** Area over a straight piece of ground from its depths at both ends. */
function wetted(d0: number, d1: number, width: number): number {
  if (d0 <= 0 && d1 <= 0) return 0;
  if (d0 >= 0 && d1 >= 0) return 0.5 * (d0 + d1) * width;
  const [deep, dry] = d0 > 0 ? [d0, d1] : [d1, d0];
  return (0.5 * deep * deep * width) / (deep - dry);
}

/** Index of the lowest point, the first where there are several. */
export const lowestIndex = ({ points }: Pick<Section, 'points'>): number =>
  points.reduce((low, [, z], i) => (z < points[low][1] ? i : low), 0);

/** Width of the channel when it is full, m. */
export const bankfullWidth = (section: Pick<Section, 'points' | 'banks'>): number =>
  topWidthAt(section, bankfullStage(section), section.banks ?? undefined);
