import { say, typed, type SaidQuantity } from '../../units/message';
import type { Quantity } from '../../units/units';
import { CASE_LIMITS } from '../caseLimits';
import { join, type Faults } from './faults';

export interface SeriesRule {
  /** Key of the places (strictly increasing) and what they are */
  at: 'times' | 'chainages' | 'stages' | 'depths';
  /** Keys of the values, each as long as the places */
  values: readonly string[];
  /** Keys among them whose values cannot be negative */
  notNegative?: readonly string[];
  /** Keys among them whose values cannot fall */
  notFalling?: readonly string[];
  /** Keys among them whose values must rise */
  rising?: readonly string[];
  /** Fewest entries; 1 by default */
  least?: number;
}

/** Times are in seconds everywhere; factors have no unit. */
const QUANTITIES: Record<string, Quantity | undefined> = {
  chainages: 'chainage',
  stages: 'elevation',
  flows: 'flow',
  volumes: 'volume',
  openings: 'depth',
  depths: 'depth',
};

/** A value of the list as it was given, with its unit. */
function amount(value: number, key: string): SaidQuantity | string {
  const quantity = QUANTITIES[key];
  if (quantity) return typed(value, quantity);
  return key === 'times' ? `${value} s` : String(value);
}

/** Parallel lists of places and values in the record at `path`. */
export function checkSeries(
  faults: Faults,
  path: string,
  record: Record<string, unknown>,
  rule: SeriesRule,
): void {
  const places = numbers(faults, join(path, rule.at), record[rule.at], rule.at, rule.least ?? 1);
  if (places) {
    if (rule.notNegative?.includes(rule.at) && places[0] < 0) {
      faults.add(
        `${join(path, rule.at)}[0]`,
        say`is ${amount(places[0], rule.at)}; it cannot be negative`,
      );
    }
    for (let k = 1; k < places.length; k++) {
      if (places[k] > places[k - 1]) continue;
      faults.add(
        `${join(path, rule.at)}[${k}]`,
        say`${amount(places[k], rule.at)} is not beyond the ${amount(places[k - 1], rule.at)} before it; order the entries, one value at each`,
      );
    }
  }
  for (const key of rule.values) {
    const values = numbers(faults, join(path, key), record[key], key, rule.least ?? 1);
    if (!values) continue;
    if (places && values.length !== places.length) {
      faults.add(
        join(path, key),
        `has ${values.length} values for ${places.length} ${rule.at}; give one for each`,
      );
    }
    values.forEach((value, k) => {
      const at = `${join(path, key)}[${k}]`;
      if (rule.notNegative?.includes(key) && value < 0) {
        faults.add(at, say`is ${amount(value, key)}; it cannot be negative`);
      }
      if (rule.rising?.includes(key) && k > 0 && value <= values[k - 1]) {
        faults.add(at, say`is ${amount(value, key)}, not above the value before it; it must rise`);
      }
      if (rule.notFalling?.includes(key) && k > 0 && value < values[k - 1]) {
        faults.add(at, say`is ${amount(value, key)}, below the value before it; it must not fall`);
      }
    });
  }
}

function numbers(
  faults: Faults,
  path: string,
  value: unknown,
  what: string,
  least: number,
): number[] | null {
  // A key that is missing has been named already.
  if (value === undefined) return null;
  if (!faults.array(path, value, least, CASE_LIMITS.seriesLength)) return null;
  let fine = true;
  value.forEach((entry, k) => {
    if (
      !faults.number(
        `${path}[${k}]`,
        entry,
        `one of the ${what}${what === 'times' ? ' in s' : ''}`,
        QUANTITIES[what],
      )
    )
      fine = false;
    else if (Math.abs(entry) > (what === 'volumes' ? 1e13 : 1e9)) {
      fine = faults.add(`${path}[${k}]`, `${entry} is out of range; check the unit`);
    }
  });
  return fine ? (value as number[]) : null;
}
