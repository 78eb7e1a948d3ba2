import type { Fault } from '../../errors';
import { asSaid, say, sayIn, unitOf, type Said } from '../../units/message';
import type { Quantity, UnitSystem } from '../../units/units';
/** One fault of a case: where in the document, what is wrong and how to mend it. */
export interface CaseFault extends Said {
  path: string;
}

/** The faults as a study in these units reads them. */
export const faultsIn = (system: UnitSystem, faults: readonly CaseFault[]): Fault[] =>
  faults.map(({ path, ...said }) => ({ path, message: sayIn(system, said) }));

/** Collects the faults of a document; each check tells whether what it looked at can be used further. */
export class Faults {
  readonly list: CaseFault[] = [];

  add(path: string, words: string | Said): false {
    this.list.push({ path, ...asSaid(words) });
    return false;
  }

  /** An object, with every key known and every required one there. */
  record(
    path: string,
    value: unknown,
    required: readonly string[],
    optional: readonly string[] = [],
  ): value is Record<string, unknown> {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      return this.add(path, `must be an object with ${required.join(', ')}, not ${kindOf(value)}`);
    }
    const known = [...required, ...optional];
    for (const key of Object.keys(value)) {
      if (!known.includes(key)) {
        this.add(join(path, key), `is not known here; remove it (known: ${known.join(', ')})`);
      }
    }
    for (const key of required) {
      if (!(key in value)) this.add(join(path, key), 'is missing; add it');
    }
    return true;
  }

  array(path: string, value: unknown, least: number, most: number): value is unknown[] {
    if (!Array.isArray(value)) return this.add(path, `must be a list, not ${kindOf(value)}`);
    if (value.length < least) {
      return this.add(path, `has ${value.length} entries; give at least ${least}`);
    }
    if (value.length > most) {
      return this.add(path, `has ${value.length} entries; at most ${most} are allowed`);
    }
    return true;
  }

  /** A finite number; `what` as in "a width", in the unit of the quantity where it has one. */
  number(path: string, value: unknown, what: string, unit?: Quantity): value is number {
    if (typeof value === 'number' && Number.isFinite(value)) return true;
    const inUnit = unit ? [' in ', unitOf(unit)] : '';
    return this.add(path, say`must be ${what}${inUnit} as a finite number, not ${kindOf(value)}`);
  }

  text(path: string, value: unknown, most: number): value is string {
    if (typeof value !== 'string') return this.add(path, `must be a text, not ${kindOf(value)}`);
    if (value.length > most) {
      return this.add(path, `has ${value.length} characters; at most ${most} are allowed`);
    }
    return true;
  }

  /** One of the kinds that a part of the case can have. */
  kind(path: string, value: unknown, kinds: readonly string[]): string | null {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      this.add(path, `must be an object with a kind, not ${kindOf(value)}`);
      return null;
    }
    const kind: unknown = 'kind' in value ? value.kind : undefined;
    if (typeof kind === 'string' && kinds.includes(kind)) return kind;
    this.add(join(path, 'kind'), `must be one of ${kinds.join(', ')}, not ${kindOf(kind)}`);
    return null;
  }
}

export function join(path: string, key: string): string {
  return path === '' ? key : `${path}.${key}`;
}

export function kindOf(value: unknown): string {
  if (value === undefined) return 'missing';
  if (value === null) return 'null';
  if (typeof value === 'string') return `the text "${value.slice(0, 40)}"`;
  if (typeof value === 'number') return String(value);
  if (typeof value === 'boolean') return String(value);
  return Array.isArray(value) ? 'a list' : 'an object';
}
