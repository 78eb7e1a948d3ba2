import { bracket } from './interpolate';

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** A line as it is drawn, px; x never falls. */
export interface Polyline {
  x: ArrayLike<number>;
  y: ArrayLike<number>;
}

/** What a label keeps clear of. */
export interface Obstacles {
  /** Never to be lain on. */
  lines: readonly Polyline[];
  /** To be crossed rather than to wander off, e.g. the cursor; the label then needs a halo. */
  soft?: readonly Polyline[];
  taken?: readonly Box[];
}

/**
 * Where a label of a size stands beside a point without lying on a line: the nearest free place of those right and left,
 * above and below, within the bounds; where none is free, the one that hides least.
 */
export function placeLabel(
  point: { x: number; y: number },
  size: { width: number; height: number },
  bounds: Box,
  { lines, soft = [], taken = [] }: Obstacles,
  gap = 8,
): Box {
  let best: Box | null = null;
  let bestCost = Infinity;
  const right = point.x + gap;
  const left = point.x - gap - size.width;
  const leftmost = Math.max(left, bounds.x);
  const rightmost = Math.min(right, bounds.x + bounds.width - size.width);
  // Beside the point first; then as far aside as the bounds allow, over or under it.
  const columns = [
    { x: right, shift: 0 },
    { x: left, shift: 0 },
    { x: leftmost, shift: leftmost - left },
    { x: rightmost, shift: right - rightmost },
  ];
  const rows = Math.ceil(bounds.height / STEP);
  for (let row = 0; row <= rows && row * STEP < bestCost; row++) {
    for (const { x, shift } of columns) {
      for (const up of row === 0 ? [0] : [-1, 1]) {
        const box = { x, y: point.y - size.height / 2 + up * row * STEP, ...size };
        if (!within(box, bounds) || covers(box, point)) continue;
        const hidden =
          lines.reduce((sum, each) => sum + crossings(each, box), 0) +
          10 * taken.filter((each) => overlap(each, box)).length;
        const cost =
          hidden * HIDING +
          soft.filter((each) => crossings(each, box) > 0).length * CROSSING +
          row * STEP +
          shift;
        if (cost >= bestCost) continue;
        best = box;
        bestCost = cost;
      }
    }
  }
  return best ?? clamp({ x: point.x + gap, y: point.y, ...size }, bounds);
}

/** Step up and down that is tried, px. */
const STEP = 4;
/** A label on a line is worse than any way off; one across the cursor as bad as this way off, px. */
const HIDING = 10_000;
const CROSSING = 40;
/** Air about a label, px. */
const CLEAR = 3;

const within = (box: Box, bounds: Box) =>
  box.x >= bounds.x &&
  box.y >= bounds.y &&
  box.x + box.width <= bounds.x + bounds.width &&
  box.y + box.height <= bounds.y + bounds.height;

const covers = (box: Box, point: { x: number; y: number }) =>
  overlap(box, { x: point.x - 6, y: point.y - 6, width: 12, height: 12 });

export const overlap = (a: Box, b: Box): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

const clamp = (box: Box, bounds: Box): Box => ({
  ...box,
  x: Math.max(bounds.x, Math.min(box.x, bounds.x + bounds.width - box.width)),
  y: Math.max(bounds.y, Math.min(box.y, bounds.y + bounds.height - box.height)),
});

/** How many stretches of a line pass through the box, with a little air around it. */
function crossings({ x, y }: Polyline, box: Box): number {
  const left = box.x - CLEAR;
  const right = box.x + box.width + CLEAR;
  const top = box.y - CLEAR;
  const bottom = box.y + box.height + CLEAR;
  let count = 0;
  for (let i = bracket(x, left) + 1; i < x.length && x[i - 1] <= right; i++) {
    const x0 = Math.max(left, Math.min(x[i - 1], x[i]));
    const x1 = Math.min(right, Math.max(x[i - 1], x[i]));
    if (x0 > x1) continue;
    const slope = x[i] === x[i - 1] ? 0 : (y[i] - y[i - 1]) / (x[i] - x[i - 1]);
    const upright = x[i] === x[i - 1];
    const a = upright ? y[i - 1] : y[i - 1] + slope * (x0 - x[i - 1]);
    const b = upright ? y[i] : y[i - 1] + slope * (x1 - x[i - 1]);
    if (Math.min(a, b) <= bottom && Math.max(a, b) >= top) count++;
  }
  return count;
}
