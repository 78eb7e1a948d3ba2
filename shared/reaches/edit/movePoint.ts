import type { Section } from '../../surveys/types';
import { setPoint } from './setPoint';

/** `setPoint` for a hand that draws: the point never passes a neighbour. */
export function movePoint(section: Section, index: number, [y, z]: [number, number]): Section {
  const { points } = section;
  const low = points[index - 1]?.[0] ?? -Infinity;
  const high = points[index + 1]?.[0] ?? Infinity;
  return setPoint(section, index, [Math.min(Math.max(y, low), high), z]);
}
