import { fromSi, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { valueTicks } from './ticks';
import { THIN } from './waterPaths';

/** What a long section is drawn from: rows of one length, m. */
export interface LongProfile {
  chainages: ArrayLike<number>;
  bed: ArrayLike<number>;
  leftBank?: ArrayLike<number> | null;
  rightBank?: ArrayLike<number> | null;
  peakStage?: ArrayLike<number> | null;
  /** Tops of structures and levels that were observed: they fit as well. */
  heights?: readonly number[];
}

/** How high the water was seen to stand, m; a model that fits lies within the tolerance. */
export interface ObservedLevel {
  chainage: number;
  level: number;
  tolerance: number;
}

/** Least height of the drawing, m, so that a level pool looks level. */
const LEAST = 1;
/** Ground below the lowest bed that is drawn, as a share of the height: room for names. */
const FOOT = 0.12;

/** The scales of a long section in the study's units. The highest water and the banks always fit. */
export function longSectionFrame(
  size: { width: number; height: number },
  profile: LongProfile,
  system: UnitSystem,
): Frame & { xTicks: number[]; yTicks: number[] } {
  const { bed, leftBank, rightBank, peakStage, heights } = profile;
  const rows = [bed, leftBank, rightBank, peakStage, heights];
  const extent = extentOf(...rows.filter((row) => row != null)) ?? [0, 1];
  const foot = extent[0] - FOOT * (extent[1] - extent[0]);
  const y = roomyExtent(
    [fromSi(foot, 'elevation', system), fromSi(extent[1], 'elevation', system)],
    fromSi(LEAST, 'elevation', system),
    8,
  );
  const along = extentOf(profile.chainages) ?? [0, 1];
  const x: [number, number] = [
    fromSi(along[0], 'chainage', system),
    fromSi(along[1], 'chainage', system),
  ];
  const frame = makeFrame(size, { top: 28, right: 16, bottom: 28, left: 46 }, x, y);
  return {
    ...frame,
    xTicks: valueTicks(x, frame.right - frame.left, 72),
    yTicks: valueTicks(y, frame.bottom - frame.top, 44),
  };
}

/** The same profile with room for what stands in it and for what was observed of it. */
export function withRoomFor(
  profile: LongProfile,
  structures: readonly { top: number | null }[],
  observed: readonly ObservedLevel[],
): LongProfile {
  if (structures.length === 0 && observed.length === 0) return profile;
  const heights = [
    ...structures.flatMap(({ top }) => top ?? []),
    ...observed.flatMap(({ level, tolerance }) => [level - tolerance, level + tolerance]),
  ];
  return { ...profile, heights };
}

/** The surface where there is water; NaN, which lifts the pen, where there is none. */
export function wetSurface(bed: ArrayLike<number>, stage: ArrayLike<number>): Float64Array {
  const out = new Float64Array(bed.length);
  for (let i = 0; i < bed.length; i++) out[i] = stage[i] - bed[i] > THIN ? stage[i] : NaN;
  return out;
}
