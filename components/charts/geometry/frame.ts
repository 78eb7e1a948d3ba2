import { scaleLinear, type ScaleLinear } from 'd3-scale';

/** Where the plot stands within its drawing, px. */
export interface Margins {
  top: number;
  right: number;
  bottom: number;
  left: number;
}

export type Extent = readonly [number, number];

/** A drawing of a size with its scales: data in, px out. `y` grows upwards as the ground does. */
export interface Frame {
  width: number;
  height: number;
  left: number;
  right: number;
  top: number;
  bottom: number;
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
}

export function makeFrame(
  size: { width: number; height: number },
  margins: Margins,
  xExtent: Extent,
  yExtent: Extent,
): Frame {
  const left = margins.left;
  const top = margins.top;
  const right = Math.max(left + 1, size.width - margins.right);
  const bottom = Math.max(top + 1, size.height - margins.bottom);
  return {
    ...size,
    left,
    right,
    top,
    bottom,
    x: scaleLinear(xExtent, [left, right]),
    y: scaleLinear(yExtent, [bottom, top]),
  };
}

/** Smallest and largest finite value over several rows; null where there is none. */
export function extentOf(...rows: ArrayLike<number>[]): [number, number] | null {
  let low = Infinity;
  let high = -Infinity;
  for (const row of rows) {
    for (let i = 0; i < row.length; i++) {
      if (row[i] < low) low = row[i];
      if (row[i] > high && row[i] !== Infinity) high = row[i];
    }
  }
  return low <= high ? [low, high] : null;
}

/**
 * The extent with room above and below, ending on round numbers. A range of nothing is opened to `least`, so that a
 * still pool is drawn level and not as noise.
 */
export function roomyExtent(extent: Extent, least: number, ticks = 5): [number, number] {
  let [low, high] = extent;
  if (high - low < least) {
    const middle = (low + high) / 2;
    low = middle - least / 2;
    high = middle + least / 2;
  }
  const [niceLow, niceHigh] = scaleLinear([low, high], [0, 1]).nice(ticks).domain();
  return [niceLow, niceHigh];
}
