import { groundAt, thalwegOf } from '../reaches/sectionGeometry';
import type { CrestPoint } from '../case/structures';
import type { Section } from '../surveys/types';

export type Shape = Pick<Section, 'points' | 'banks'>;
type Placed = Shape & Pick<Section, 'chainage'>;

/** The two columns of a crest as [offset, level] points. */
export const crestPoints = (crest: { offsets: number[]; levels: number[] }): CrestPoint[] =>
  crest.offsets.map((offset, i) => [offset, crest.levels[i]]);

export const lowestOf = (crest: readonly CrestPoint[]): number =>
  crest.reduce((low, [, level]) => Math.min(low, level), Infinity);
export const highestOf = (crest: readonly CrestPoint[]): number =>
  crest.reduce((high, [, level]) => Math.max(high, level), -Infinity);

/** Level of the crest at an offset, m. */
export const levelAt = (crest: readonly CrestPoint[], offset: number): number =>
  groundAt({ points: [...crest] }, offset);

/** The surveyed section nearest to a chainage, raised or lowered to the bed there; m. */
export function sectionNear<S extends Placed>(sections: readonly S[], chainage: number): S {
  const near = sections.reduce((best, section) =>
    Math.abs(section.chainage - chainage) < Math.abs(best.chainage - chainage) ? section : best,
  );
  const beds = { points: sections.map((s): [number, number] => [s.chainage, thalwegOf(s)]) };
  const rise = groundAt(beds, chainage) - thalwegOf(near);
  return { ...near, points: near.points.map(([y, z]): [number, number] => [y, z + rise]) };
}

/** A level crest across a section, and the ground where that is higher: water beside it flows over the ground. m. */
export function crestOverGround({ points }: Shape, level: number): CrestPoint[] {
  const crest: CrestPoint[] = [];
  const push = (offset: number, height: number) => {
    const point: CrestPoint = [centimetres(offset), centimetres(Math.max(height, level))];
    const [last, before] = [crest.at(-1), crest.at(-2)];
    // Of a level stretch both ends say all.
    if (last?.[1] === point[1] && before?.[1] === point[1]) crest.pop();
    else if (last?.[0] === point[0] && last[1] === point[1]) return;
    crest.push(point);
  };
  points.forEach(([y, z], i) => {
    const before = points[i - 1];
    if (before && before[1] > level !== z > level) {
      const share = (level - before[1]) / (z - before[1]);
      push(before[0] + share * (y - before[0]), level);
    }
    push(y, z);
  });
  return crest;
}

/** Area of a section below a level, m². */
export function areaBelow({ points }: Shape, level: number): number {
  let area = 0;
  for (let i = 1; i < points.length; i++) {
    const [[y0, z0], [y1, z1]] = [points[i - 1], points[i]];
    const [a, b] = [level - z0, level - z1];
    if (a <= 0 && b <= 0) continue;
    const wet = a > 0 && b > 0 ? 1 : Math.max(a, b) / Math.abs(a - b);
    area += (y1 - y0) * wet * 0.5 * (Math.max(a, 0) + Math.max(b, 0));
  }
  return area;
}

/** Volume of a level pool above a chainage as the sections hold it, by the mean of neighbouring areas, m³. */
export function poolVolume(sections: readonly Placed[], chainage: number, level: number): number {
  const above = sections.filter((section) => section.chainage < chainage);
  const ends = [...above, { ...sectionNear(sections, chainage), chainage }];
  let volume = 0;
  for (let i = 1; i < ends.length; i++)
    volume +=
      0.5 *
      (areaBelow(ends[i - 1], level) + areaBelow(ends[i], level)) *
      (ends[i].chainage - ends[i - 1].chainage);
  return volume;
}

const centimetres = (metres: number) => Math.round(metres * 100) / 100;
