import { say, typed, unitOf } from '../../../units/message';
import type { Quantity } from '../../../units/units';
import { CASE_LIMITS } from '../../caseLimits';
import { join, type Faults } from '../faults';

export interface Range {
  /** As in "a width", or with a unit that is the same everywhere: "a time in s" */
  what: string;
  unit?: Quantity;
  least?: number;
  above?: number;
  most?: number;
}

/** A number of a record within its range, where it is there. Tells whether it can be used. */
export function checkNumber(
  faults: Faults,
  path: string,
  record: Record<string, unknown>,
  key: string,
  { what, unit, least, above, most = 1e7 }: Range,
): boolean {
  const value = record[key];
  if (value === undefined) return false;
  const at = join(path, key);
  if (!faults.number(at, value, what, unit)) return false;
  const amount = (given: number) => (unit && given !== 0 ? typed(given, unit) : given);
  if (above !== undefined && value <= above) {
    return faults.add(at, say`is ${amount(value)}; ${what} must be above ${amount(above)}`);
  }
  if (least !== undefined && value < least) {
    return faults.add(at, say`is ${amount(value)}; ${what} must be at least ${amount(least)}`);
  }
  if (Math.abs(value) > most) {
    return faults.add(
      at,
      say`is ${amount(value)}; ${what} of more than ${amount(most)} cannot be meant, check the unit`,
    );
  }
  return true;
}

/** One of some words, where it is there. */
export function checkWord(
  faults: Faults,
  path: string,
  record: Record<string, unknown>,
  key: string,
  words: readonly string[],
): void {
  const value = record[key];
  if (value === undefined || (typeof value === 'string' && words.includes(value))) return;
  faults.add(join(path, key), `must be one of ${words.join(', ')}`);
}

/** A crest as [offset, level] points; its first and last offset where it can be used. */
export function checkCrest(faults: Faults, path: string, value: unknown): [number, number] | null {
  if (value === undefined || !faults.array(path, value, 2, CASE_LIMITS.crestPoints)) return null;
  const before = faults.list.length;
  let last = -Infinity;
  value.forEach((point, k) => {
    const at = `${path}[${k}]`;
    if (!Array.isArray(point) || point.length !== 2) {
      faults.add(at, say`must be [offset, level], two numbers in ${unitOf('length')}`);
      return;
    }
    const [offset, level] = point as [unknown, unknown];
    faults.number(`${at}[1]`, level, 'a level', 'elevation');
    if (!faults.number(`${at}[0]`, offset, 'an offset', 'length')) return;
    if (offset < last) {
      faults.add(
        at,
        say`its offset ${typed(offset, 'length')} lies left of the ${typed(last, 'length')} before it; order the points`,
      );
    }
    last = offset;
  });
  if (faults.list.length > before) return null;
  const [first] = value[0] as [number, number];
  if (last <= first) {
    faults.add(path, 'has no length; give the offsets of both its ends');
    return null;
  }
  return [first, last];
}
