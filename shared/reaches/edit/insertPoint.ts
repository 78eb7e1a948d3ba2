import type { Section } from '../../surveys/types';
import { withPoints } from './withPoints';

/** A new point on the ground, half way to the next one; after the last, as far beyond it as the one before lies behind. */
export function insertPoint(section: Section, after: number): Section {
  const { points } = section;
  const here = points[after];
  const next = points[after + 1];
  const before = points[after - 1] ?? [here[0] - 1, here[1]];
  const made: [number, number] = next
    ? [(here[0] + next[0]) / 2, (here[1] + next[1]) / 2]
    : [here[0] + Math.max(1, here[0] - before[0]), here[1]];
  return withPoints(section, [...points.slice(0, after + 1), made, ...points.slice(after + 1)]);
}
