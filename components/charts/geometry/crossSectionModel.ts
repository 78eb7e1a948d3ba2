import type { Embankment, StoragePart } from '@/shared/case/caseFile';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { valueAt } from './interpolate';
import { bandPath, linePath, project } from './paths';
import { valueTicks } from './ticks';

/** What a cross-section is drawn from; a surveyed section is one. Offsets and elevations in m. */
export interface SectionShape {
  points: readonly (readonly [number, number])[];
  roughness?: readonly (readonly [number, number])[];
  banks?: readonly [number, number] | null;
  storage?: readonly StoragePart[];
  embankments?: { left?: Embankment; right?: Embankment };
}

export interface CrossSectionModel {
  frame: Frame;
  xTicks: number[];
  yTicks: number[];
  groundFill: string;
  groundLine: string;
  /** Bank marks on the ground, px. */
  banks: { x: number; y: number }[];
  /** Roughness zones across the drawing, px. */
  zones: { n: number; from: number; to: number }[];
  /** px of an offset and of an elevation, m. */
  px: (offset: number) => number;
  py: (elevation: number) => number;
}

/** Ground below the lowest point that is drawn, as a share of the height: room for the roughness of the zones. */
const FOOT = 0.18;

/** All of a cross-section that does not move with the water. Water above the ends still fits. */
export function crossSectionModel(
  size: { width: number; height: number },
  section: SectionShape,
  highest: number | null,
  system: UnitSystem,
): CrossSectionModel {
  const offsets = section.points.map(([offset]) => offset);
  const ground = section.points.map(([, elevation]) => elevation);
  const unit = (m: number) => fromSi(m, 'elevation', system);
  const crests = Object.values(section.embankments ?? {}).map(({ crest }) => crest);
  const [low, high] = extentOf(ground, crests, highest === null ? [] : [highest]) ?? [0, 1];
  const y = roomyExtent([unit(low - FOOT * (high - low)), unit(high)], unit(1), 5);
  const [first, last] = extentOf(offsets) ?? [0, 1];
  const x: [number, number] = [
    fromSi(first, 'length', system),
    fromSi(last > first ? last : first + 1, 'length', system),
  ];
  const frame = makeFrame(size, { top: 10, right: 14, bottom: 26, left: 46 }, x, y);
  const px = (m: number) => frame.x(fromSi(m, 'length', system));
  const py = (m: number) => frame.y(unit(m));
  const xs = project(offsets, px);
  const ys = project(ground, py);
  const zones = section.roughness ?? [];
  return {
    frame,
    xTicks: valueTicks(x, frame.right - frame.left, 60),
    yTicks: valueTicks(y, frame.bottom - frame.top, 28),
    groundFill: bandPath(xs, ys, frame.bottom),
    groundLine: linePath(xs, ys),
    banks: (section.banks ?? []).map((offset) => ({
      x: px(offset),
      y: py(valueAt(offsets, ground, offset)),
    })),
    zones: zones
      .map(([from, n], i) => ({
        n,
        from: Math.max(frame.left, px(Math.max(from, first))),
        to: Math.min(frame.right, i + 1 < zones.length ? px(zones[i + 1][0]) : frame.right),
      }))
      .filter(({ from, to }) => to > from),
    px,
    py,
  };
}
