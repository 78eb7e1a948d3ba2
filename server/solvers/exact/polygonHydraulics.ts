import type { SectionInput } from '../../../shared/case/caseFile';

/** Exact hydraulics of surveyed sections, written apart from the solver and from the equations alone, so that
 *  the two can be compared. Slow and plain.
 *
 *  Between two surveyed sections the ground is a ruled surface: the parts left of the banks, between them and
 *  right of them are matched each by itself, and points at the same fraction of a part are joined by straight
 *  lines, and so is Manning's n. */
export interface Strip {
  /** Offset and elevation of both ends, m. */
  from: [number, number];
  to: [number, number];
  manning: number;
  /** Strips of one zone share a hydraulic radius. */
  zone: number;
}

export interface Hydraulics {
  area: number;
  topWidth: number;
  conveyance: number;
}

export function hydraulicsAt(strips: readonly Strip[], stage: number): Hydraulics {
  const zones = new Map<number, { area: number; perimeter: number; manning: number }>();
  let area = 0;
  let topWidth = 0;
  for (const strip of strips) {
    const wet = wetPart(strip, stage);
    if (!wet) continue;
    area += wet.area;
    topWidth += wet.width;
    const zone = zones.get(strip.zone) ?? { area: 0, perimeter: 0, manning: strip.manning };
    zone.area += wet.area;
    zone.perimeter += wet.perimeter;
    zones.set(strip.zone, zone);
  }
  let conveyance = 0;
  for (const zone of zones.values()) {
    conveyance += (zone.area * (zone.area / zone.perimeter) ** (2 / 3)) / zone.manning;
  }
  return { area, topWidth, conveyance };
}

/** What of a strip lies under water. */
function wetPart({ from, to }: Strip, stage: number) {
  const low = Math.min(from[1], to[1]);
  const high = Math.max(from[1], to[1]);
  if (stage <= low) return null;
  const width = to[0] - from[0];
  const length = Math.hypot(width, high - low);
  const share = stage >= high ? 1 : (stage - low) / (high - low);
  const meanDepth = stage >= high ? stage - (low + high) / 2 : (stage - low) / 2;
  return { width: width * share, perimeter: length * share, area: width * share * meanDepth };
}

/** Strips of the ruled surface at the fraction `weight` of the way from section a to section b. */
export function stripsBetween(a: SectionInput, b: SectionInput, weight: number): Strip[] {
  const partsA = partsOf(a);
  const partsB = partsOf(b);
  const mix = (p: number, q: number) => p + (q - p) * weight;
  return partsA.flatMap((partA, zone) => {
    const partB = partsB[zone];
    const fractions = [...new Set([...partA.fractions, ...partB.fractions])].sort((p, q) => p - q);
    const nodes = fractions.map((fraction): [number, number] => {
      const [offsetA, elevationA] = pointAt(partA, fraction);
      const [offsetB, elevationB] = pointAt(partB, fraction);
      return [mix(offsetA, offsetB), mix(elevationA, elevationB)];
    });
    const manning = mix(partA.manning, partB.manning);
    return nodes.slice(1).map((to, i) => ({ from: nodes[i], to, manning, zone }));
  });
}

interface Part {
  points: [number, number][];
  fractions: number[];
  manning: number;
}

/** Left of the banks, between, right. Needs banks at survey points and one roughness in each part. */
function partsOf(section: SectionInput): Part[] {
  const offsets = section.points.map(([offset]) => offset);
  const [left, right] = section.banks ?? [offsets[0], offsets[offsets.length - 1]];
  const limits = [offsets[0], left, right, offsets[offsets.length - 1]];
  return [0, 1, 2].flatMap((i) => {
    const [from, to] = [limits[i], limits[i + 1]];
    if (to <= from) return [];
    const points = section.points.filter(([offset]) => offset >= from && offset <= to);
    const fractions = points.map(([offset]) => (offset - from) / (to - from));
    const zone = section.roughness.filter(([start]) => start <= from).at(-1)!;
    return [{ points, fractions, manning: zone[1] }];
  });
}

function pointAt({ points, fractions }: Part, fraction: number): [number, number] {
  const i = Math.max(
    1,
    fractions.findIndex((f) => f >= fraction - 1e-12),
  );
  const share = (fraction - fractions[i - 1]) / (fractions[i] - fractions[i - 1]);
  return [
    points[i - 1][0] + share * (points[i][0] - points[i - 1][0]),
    points[i - 1][1] + share * (points[i][1] - points[i - 1][1]),
  ];
}
