import type { Section } from '../../surveys/types';
import { areaBelow, bankfullStage, lowestIndex } from '../sectionGeometry';
import { withPoints } from './withPoints';

/**
 * Points left out where the ground without them stays within a distance of the ground with them: Douglas, D.H. & Peucker,
 * T.K. (1973), Algorithms for the reduction of the number of points required to represent a digitized line, Cartographica
 * 10(2), 112-122 [memory]. Distance is measured upright to the line in the plane of offset and elevation, m. Kept always:
 * both ends, the lowest point, and points on which a bank mark, zone, storage part or embankment stands.
 */
export function thinPoints(section: Section, tolerance: number): Section {
  const { points } = section;
  const keep = new Set(fixedPoints(section));
  const anchors = [...keep].sort((a, b) => a - b);
  for (let i = 1; i < anchors.length; i++)
    keepFarthest(points, anchors[i - 1], anchors[i], tolerance, keep);
  if (keep.size === points.length) return section;
  const kept = [...keep].sort((a, b) => a - b);
  const thinned = withPoints(
    section,
    kept.map((i) => points[i]),
  );
  return {
    ...thinned,
    coordinates: section.coordinates && kept.map((i) => section.coordinates![i]),
  };
}

function fixedPoints(section: Section): number[] {
  const { points, banks, roughness, storage = [], embankments = {} } = section;
  const offsets = new Set([
    ...(banks ?? []),
    ...roughness.map(([from]) => from),
    ...storage.flatMap(({ from, to }) => [from, to]),
    ...[embankments.left, embankments.right].flatMap((it) => (it ? [it.offset] : [])),
  ]);
  const standing = points.flatMap(([y], i) => (offsets.has(y) ? [i] : []));
  return [0, lowestIndex(section), points.length - 1, ...standing];
}

/** The recursion of the method, on a stack of its own: a section has up to 2,000 points. */
function keepFarthest(
  points: Section['points'],
  start: number,
  stop: number,
  tolerance: number,
  keep: Set<number>,
): void {
  const stack: [number, number][] = [[start, stop]];
  for (let span = stack.pop(); span; span = stack.pop()) {
    const [from, to] = span;
    let [farthest, distance] = [-1, tolerance];
    for (let i = from + 1; i < to; i++) {
      const away = distanceTo(points[i], points[from], points[to]);
      if (away > distance) [farthest, distance] = [i, away];
    }
    if (farthest < 0) continue;
    keep.add(farthest);
    stack.push([from, farthest], [farthest, to]);
  }
}

function distanceTo(p: [number, number], a: [number, number], b: [number, number]): number {
  const [dy, dz] = [b[0] - a[0], b[1] - a[1]];
  const length = Math.hypot(dy, dz);
  if (length === 0) return Math.hypot(p[0] - a[0], p[1] - a[1]);
  return Math.abs(dy * (p[1] - a[1]) - dz * (p[0] - a[0])) / length;
}

export interface ThinningCost {
  pointsBefore: number;
  pointsAfter: number;
  /** m², signed: area below the level after less before. */
  areaChange: number;
  /** Share of the area before; 0 where there is none. */
  relative: number;
  /** m: the lower bank, or the lower end of a section without bank marks. */
  level: number;
}

/** What thinning does to the area of flow below the lower bank. */
export function thinningCost(before: Section, after: Section): ThinningCost {
  const level = bankfullStage(before);
  const within = before.banks ?? undefined;
  const area = areaBelow(before, level, within);
  const areaChange = areaBelow(after, level, within) - area;
  return {
    pointsBefore: before.points.length,
    pointsAfter: after.points.length,
    areaChange,
    relative: area > 0 ? areaChange / area : 0,
    level,
  };
}
