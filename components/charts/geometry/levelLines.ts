import type { Box } from './placeLabel';
import { textWidth } from './textWidth';

/** A level to hold a stage against, SI. */
export interface NamedLevel {
  name: string;
  level: number;
}

export interface LevelLine {
  name: string;
  y: number;
  /** Where its name stands; null where another stands there. */
  box: Box | null;
}

/** Those levels that a drawing of values from `low` to `high` shows: within as much again, so that the curve stays readable. */
export function levelsNear(
  levels: readonly NamedLevel[],
  low: number,
  high: number,
  least: number,
): NamedLevel[] {
  const room = Math.max(high - low, least);
  return levels.filter(({ level }) => level >= low - room && level <= high + room);
}

const HEIGHT = 15;

/** Their lines, px, each with its name above it at the left where there is room. */
export function levelLines(
  levels: readonly NamedLevel[],
  yOf: (level: number) => number,
  left: number,
  fontSize: number,
): LevelLine[] {
  const taken: number[] = [];
  return levels.map(({ name, level }) => {
    const y = yOf(level);
    const isFree = taken.every((other) => Math.abs(other - y) >= HEIGHT);
    if (isFree) taken.push(y);
    const box = { x: left + 4, y: y - HEIGHT, width: textWidth(name, fontSize), height: HEIGHT };
    return { name, y, box: isFree ? box : null };
  });
}
