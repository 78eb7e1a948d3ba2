import { say, typed } from '../../units/message';
import type { Faults } from './faults';

/** Largest elevation, offset or chainage (m, either sign) that can be meant. */
const FARTHEST = 1e7;

/** A length or level in m; `what` as in "an offset". */
export function checkMetres(
  faults: Faults,
  path: string,
  value: unknown,
  what: string,
): value is number {
  if (!faults.number(path, value, what, 'length')) return false;
  if (Math.abs(value) <= FARTHEST) return true;
  return faults.add(path, say`${typed(value, 'length')} is out of range; check the unit`);
}
