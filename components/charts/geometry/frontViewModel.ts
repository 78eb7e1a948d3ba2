import type { BreachBody, StructureBody } from '@/shared/scenarios/structures/schemas';
import { crestPoints, levelAt, type Shape } from '@/shared/structures/crests';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { valueTicks } from './ticks';

type Point = readonly [number, number];

/** A piece of a structure seen from upstream: [offset, level] in m. */
export interface FrontShape {
  /** What holds water, what lets it through, and what is still to come of a breach. */
  role: 'body' | 'opening' | 'growth';
  points: Point[];
  /** Of a pipe: centre and radius, m. */
  circle?: { offset: number; level: number; radius: number };
}

export interface FrontViewModel {
  frame: Frame;
  xTicks: number[];
  yTicks: number[];
  /** px of an offset and of a level, m. */
  px: (offset: number) => number;
  py: (level: number) => number;
}

/** Gap between two barrels, as a share of their width. */
const GAP = 0.5;
/** How far a breach has grown in the views between its beginning and its end. */
const STAGES = [0.33, 0.66, 1];

/** What is drawn of a structure as it is typed; nothing of what is missing. */
export function frontShapes(structure: StructureBody, section: Shape): FrontShape[] {
  const crest = crestOf(structure);
  const body: FrontShape[] = crest.length > 1 ? [{ role: 'body', points: crest }] : [];
  const middle = middleOf(section);
  switch (structure.kind) {
    case 'weir':
      return body;
    case 'sluice': {
      const { width, sill, openings } = structure;
      const opening = Math.max(0, ...openings);
      if (!known(width) || !known(sill) || opening === 0) return body;
      return [...body, box('opening', middle, width, sill, sill + opening)];
    }
    case 'culvert':
      return [...body, ...barrels(structure, middle)];
    case 'bridge': {
      const { soffit } = structure;
      if (!known(soffit)) return body;
      const ends = crest.length > 1 ? crest : section.points;
      const [left, right] = [ends[0][0], ends[ends.length - 1][0]];
      const deck = [...crest].reverse();
      if (deck.length < 2)
        return [
          {
            role: 'body',
            points: [
              [left, soffit],
              [right, soffit],
            ],
          },
        ];
      return [{ role: 'body', points: [[left, soffit], [right, soffit], ...deck, [left, soffit]] }];
    }
    case 'breach':
      return [...body, ...growth(structure, crest)];
  }
}

/** The scales: ground and structure both fit. */
export function frontViewModel(
  size: { width: number; height: number },
  section: Shape,
  shapes: readonly FrontShape[],
  system: UnitSystem,
): FrontViewModel {
  const points = [...section.points, ...shapes.flatMap((shape) => shape.points)].filter(
    ([x, z]) => Number.isFinite(x) && Number.isFinite(z),
  );
  const unit = (m: number) => fromSi(m, 'elevation', system);
  const across = extentOf(points.map(([x]) => x)) ?? [0, 1];
  const [low, high] = extentOf(points.map(([, z]) => z)) ?? [0, 1];
  const y = roomyExtent([unit(low - 0.08 * (high - low)), unit(high)], unit(1), 5);
  const x: [number, number] = [unit(across[0]), unit(Math.max(across[1], across[0] + 1))];
  const frame = makeFrame(size, { top: 10, right: 14, bottom: 26, left: 46 }, x, y);
  return {
    frame,
    xTicks: valueTicks(x, frame.right - frame.left, 60),
    yTicks: valueTicks(y, frame.bottom - frame.top, 28),
    px: (m) => frame.x(unit(m)),
    py: (m) => frame.y(unit(m)),
  };
}

function crestOf(structure: StructureBody): Point[] {
  return 'offsets' in structure && structure.offsets.length === structure.levels.length
    ? crestPoints(structure)
    : [];
}

function barrels(
  {
    shape,
    diameter,
    width,
    height,
    barrels: count,
    invertUp,
  }: Extract<StructureBody, { kind: 'culvert' }>,
  middle: number,
): FrontShape[] {
  const across = shape === 'circular' ? diameter : width;
  const up = shape === 'circular' ? diameter : height;
  if (!known(across) || !known(up) || !known(count) || !known(invertUp)) return [];
  if (count < 1 || count > 100) return [];
  const step = across * (1 + GAP);
  return Array.from({ length: Math.round(count) }, (_, i) => {
    const at = middle + (i - (Math.round(count) - 1) / 2) * step;
    const opening = box('opening', at, across, invertUp, invertUp + up);
    return shape === 'box'
      ? opening
      : { ...opening, circle: { offset: at, level: invertUp + up / 2, radius: across / 2 } };
  });
}

/** The trapezoid of a breach at a third, two thirds and the whole of its growth. */
function growth(breach: BreachBody, crest: readonly Point[]): FrontShape[] {
  const { bottomWidth, bottomLevel, sideSlope } = breach;
  if (crest.length < 2 || !known(bottomWidth) || !known(bottomLevel) || !known(sideSlope))
    return [];
  const centre = breach.centre ?? 0.5 * (crest[0][0] + crest[crest.length - 1][0]);
  const top = levelAt([...crest] as [number, number][], centre);
  const start = breach.startLevel ?? top;
  return STAGES.map((share): FrontShape => {
    const bottom = start + share * (bottomLevel - start);
    const half = 0.5 * share * bottomWidth;
    const reach = half + sideSlope * (top - bottom);
    return {
      role: share === 1 ? 'opening' : 'growth',
      points: [
        [centre - reach, top],
        [centre - half, bottom],
        [centre + half, bottom],
        [centre + reach, top],
      ],
    };
  });
}

const box = (
  role: FrontShape['role'],
  middle: number,
  width: number,
  low: number,
  high: number,
): FrontShape => ({
  role,
  points: [
    [middle - width / 2, low],
    [middle + width / 2, low],
    [middle + width / 2, high],
    [middle - width / 2, high],
    [middle - width / 2, low],
  ],
});

/** The middle of the channel between the banks, or of the lowest ground. */
function middleOf({ points, banks }: Shape): number {
  if (banks) return 0.5 * (banks[0] + banks[1]);
  return points.reduce((low, point) => (point[1] < low[1] ? point : low))[0];
}

const known = (value: number | null): value is number => value !== null && Number.isFinite(value);
