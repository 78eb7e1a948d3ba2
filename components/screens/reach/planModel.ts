import type { ReachSection } from '@/shared/reaches/types';

type Placed = Pick<ReachSection, 'id' | 'chainage' | 'points' | 'coordinates'>;
type Px = [number, number];

export interface PlanModel {
  /** Through the lowest points of the sections, in the order of the reach. */
  river: string;
  lines: { id: string; chainage: number; d: string; at: Px }[];
  /** Through coordinates of the same system. */
  pathOf: (places: readonly (readonly [number, number])[]) => string;
  pxPerMetre: number;
  /** A round length of at most a third of the width, in units of `si` metres. */
  scaleBar: (si: number) => number;
}

const MARGIN = 24;

/** The sections from above at one scale both ways, north up, those in view in the middle of the box. Sections have coordinates. */
export function planModel(
  sections: readonly Placed[],
  { width, height }: { width: number; height: number },
  inView: readonly Placed[] = sections,
): PlanModel {
  const all = inView.flatMap(({ coordinates }) => coordinates ?? []);
  const [west, east] = extent(all.map(([easting]) => easting));
  const [south, north] = extent(all.map(([, northing]) => northing));
  const inner = {
    width: Math.max(1, width - 2 * MARGIN),
    height: Math.max(1, height - 2 * MARGIN),
  };
  const scale = Math.min(inner.width / (east - west || 1), inner.height / (north - south || 1));
  const px = ([easting, northing]: readonly [number, number]): Px => [
    width / 2 + (easting - (west + east) / 2) * scale,
    height / 2 - (northing - (south + north) / 2) * scale,
  ];
  const lines = sections.map(({ id, chainage, points, coordinates }) => {
    const places = (coordinates ?? []).map(px);
    return { id, chainage, d: path(places), at: places[lowest(points)] ?? places[0] };
  });
  return {
    river: path(lines.map(({ at }) => at)),
    lines,
    pathOf: (places) => path(places.map(px)),
    pxPerMetre: scale,
    scaleBar: (si) => roundBelow(inner.width / 3 / scale / si),
  };
}

const path = (places: readonly Px[]): string =>
  places.length === 0
    ? ''
    : `M${places.map(([x, y]) => `${x.toFixed(1)},${y.toFixed(1)}`).join('L')}`;

function extent(values: readonly number[]): [number, number] {
  let [low, high] = [Infinity, -Infinity];
  for (const value of values) {
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  return [low, high];
}

function lowest(points: Placed['points']): number {
  let at = 0;
  for (let i = 1; i < points.length; i++) if (points[i][1] < points[at][1]) at = i;
  return at;
}

/** 1, 2 or 5 times a power of ten, not above the limit. */
function roundBelow(limit: number): number {
  const power = 10 ** Math.floor(Math.log10(limit));
  return power * (limit >= 5 * power ? 5 : limit >= 2 * power ? 2 : 1);
}
