import type { Fault } from '../../errors';
import { sayIn, type Said } from '../../units/message';
import type { UnitSystem } from '../../units/units';

/** Gathers what is wrong with a scenario, each at the path of the form where it is mended. */
export class Findings {
  readonly faults: Fault[] = [];
  readonly doubts: Fault[] = [];

  /** `system`: what the quantities are told in. */
  constructor(private readonly system: UnitSystem) {}

  fault(path: string, message: string | Said) {
    this.faults.push({ path, message: this.words(message) });
  }

  doubt(path: string, message: string | Said) {
    this.doubts.push({ path, message: this.words(message) });
  }

  private words(message: string | Said): string {
    return typeof message === 'string' ? message : sayIn(this.system, message);
  }

  /** A number that must be there and within bounds; true where it is. */
  number(
    path: string,
    value: number | null,
    missing: string,
    bad?: { when: (value: number) => boolean; say: string | Said },
  ): value is number {
    if (value === null || !Number.isFinite(value)) this.fault(path, missing);
    else if (bad?.when(value)) this.fault(path, bad.say);
    else return true;
    return false;
  }
}
