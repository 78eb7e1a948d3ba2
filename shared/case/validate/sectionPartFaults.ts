import { q, say, typed } from '../../units/message';
import { CASE_LIMITS } from '../caseLimits';
import { join, type Faults } from './faults';
import { checkMetres } from './metres';

type Point = readonly [number, number];
type Span = readonly [number, number];

/** An embankment may lie below the surveyed ground by a rounding of the survey (m). */
const SURVEY_ROUNDING = 0.01;

/** What the parts of a section are checked against; each null where it cannot be used itself. */
export interface SectionGround {
  points: readonly Point[] | null;
  banks: Span | null;
}

/** `embankments` of a section: offset and crest, left of the channel and right of it. */
export function checkEmbankments(
  faults: Faults,
  path: string,
  value: unknown,
  { points, banks }: SectionGround,
): void {
  if (!faults.record(path, value, [], ['left', 'right'])) return;
  const found: Partial<Record<'left' | 'right', { offset: number; crest: number }>> = {};
  for (const side of ['left', 'right'] as const) {
    const at = join(path, side);
    const given = value[side];
    if (given === undefined || !faults.record(at, given, ['offset', 'crest'])) continue;
    const fine = metresIn(faults, at, given, { offset: 'an offset', crest: 'an elevation' });
    if (!fine || !points) continue;
    const offset = given.offset as number;
    const crest = given.crest as number;
    const first = points[0][0];
    const last = points[points.length - 1][0];
    if (offset < first || offset > last) {
      faults.add(
        join(at, 'offset'),
        say`${typed(offset, 'length')} lies outside the section, ${typed(first, 'length')} to ${typed(last, 'length')}; move the embankment into it`,
      );
      continue;
    }
    const ground = groundAt(points, offset);
    if (crest < ground - SURVEY_ROUNDING) {
      faults.add(
        join(at, 'crest'),
        say`${typed(crest, 'elevation')} lies below the ground at its offset, ${q(ground, 'elevation')}; give the top of the embankment`,
      );
    }
    if (banks && (side === 'left' ? offset > banks[0] : offset < banks[1])) {
      faults.add(
        join(at, 'offset'),
        say`${typed(offset, 'length')} lies between the bank marks, ${typed(banks[0], 'length')} to ${typed(banks[1], 'length')}; an embankment stands on the ${side} bank or outside it`,
      );
    }
    found[side] = { offset, crest };
  }
  const { left, right } = found;
  if (!left && !right) return;
  if (left && right && left.offset >= right.offset) {
    faults.add(
      path,
      say`the left embankment at ${typed(left.offset, 'length')} does not lie left of the right one at ${typed(right.offset, 'length')}; swap or mend them`,
    );
    return;
  }
  if (!points) return;
  const bed = lowestBetween(points, left?.offset ?? -Infinity, right?.offset ?? Infinity);
  for (const [side, one] of Object.entries(found)) {
    if (one.crest > bed) continue;
    faults.add(
      join(join(path, side), 'crest'),
      say`${typed(one.crest, 'elevation')} does not stand above the bed of the channel, ${q(bed, 'elevation')}; mend it`,
    );
  }
}

/** `storage` of a section: parts from left to right that hold water and do not carry it. */
export function checkStorage(
  faults: Faults,
  path: string,
  value: unknown,
  { points }: SectionGround,
  embankments: unknown,
): void {
  if (!faults.array(path, value, 0, CASE_LIMITS.storagePartsPerSection)) return;
  const parts: Span[] = [];
  value.forEach((part, k) => {
    const at = `${path}[${k}]`;
    if (!faults.record(at, part, ['from', 'to'], ['flowsAbove'])) return;
    const level: Record<string, string> =
      part.flowsAbove === undefined ? {} : { flowsAbove: 'a stage' };
    const fine = metresIn(faults, at, part, { from: 'an offset', to: 'an offset', ...level });
    if (!fine) return;
    const from = part.from as number;
    const to = part.to as number;
    if (from >= to) {
      faults.add(
        at,
        say`from ${typed(from, 'length')} does not lie left of to ${typed(to, 'length')}; swap or mend them`,
      );
      return;
    }
    const first = points?.[0][0] ?? -Infinity;
    const last = points?.[points.length - 1][0] ?? Infinity;
    if (from < first || to > last) {
      faults.add(
        at,
        say`${typed(from, 'length')} to ${typed(to, 'length')} reaches beyond the section, ${typed(first, 'length')} to ${typed(last, 'length')}; end it there`,
      );
    }
    const before = parts[parts.length - 1];
    if (before && from < before[1]) {
      faults.add(
        at,
        say`begins at ${typed(from, 'length')}, before the end of the part before it at ${typed(before[1], 'length')}; order the parts from left to right and let none overlap`,
      );
    }
    parts.push([from, to]);
  });
  if (points && parts.length > 0 && !bedFlows(points, parts, embankmentSpan(embankments))) {
    faults.add(
      path,
      'covers the lowest bed of the section, so that shallow water could not flow at all; leave the channel out',
    );
  }
}

/** Whether all these keys hold lengths or levels; one that is missing has been named already. */
function metresIn(
  faults: Faults,
  path: string,
  record: Record<string, unknown>,
  keys: Record<string, string>,
): boolean {
  return Object.entries(keys)
    .map(([key, what]) => key in record && checkMetres(faults, join(path, key), record[key], what))
    .every(Boolean);
}

/** Elevation (m) of the ground at an offset; the top of a wall. */
function groundAt(points: readonly Point[], offset: number): number {
  let ground = -Infinity;
  for (let k = 0; k + 1 < points.length; k++) {
    const [x0, z0] = points[k];
    const [x1, z1] = points[k + 1];
    if (offset < x0 || offset > x1) continue;
    const here = x1 > x0 ? z0 + ((offset - x0) / (x1 - x0)) * (z1 - z0) : Math.max(z0, z1);
    ground = Math.max(ground, here);
  }
  return ground;
}

function lowestBetween(points: readonly Point[], left: number, right: number): number {
  const inside = points.filter(([x]) => x >= left && x <= right).map(([, z]) => z);
  const ends = [left, right].filter(Number.isFinite).map((x) => groundAt(points, x));
  return Math.min(...inside, ...ends);
}

/** The offsets between the embankments, as far as they can be read. */
function embankmentSpan(value: unknown): Span {
  const offsetOf = (side: 'left' | 'right', none: number): number => {
    const given = (value as Record<string, { offset?: unknown } | undefined> | undefined)?.[side];
    return typeof given?.offset === 'number' ? given.offset : none;
  };
  return [offsetOf('left', -Infinity), offsetOf('right', Infinity)];
}

/** Whether ground beside the lowest point between the embankments lies outside all parts. */
function bedFlows(points: readonly Point[], parts: readonly Span[], [left, right]: Span): boolean {
  const inside = points
    .map((point, k) => ({ point, k }))
    .filter(({ point: [x] }) => x >= left && x <= right);
  if (inside.length === 0) return true;
  const lowest = Math.min(...inside.map(({ point }) => point[1]));
  const flowsLeftOf = (x: number): boolean => !parts.some(([from, to]) => from < x && x <= to);
  const flowsRightOf = (x: number): boolean => !parts.some(([from, to]) => from <= x && x < to);
  return inside.some(({ point: [x, z], k }) => {
    if (z > lowest) return false;
    const groundLeft = k > 0 && points[k - 1][0] < x && x > left;
    const groundRight = k + 1 < points.length && points[k + 1][0] > x && x < right;
    return (groundLeft && flowsLeftOf(x)) || (groundRight && flowsRightOf(x));
  });
}
