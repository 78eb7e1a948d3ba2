import type { Fault } from '../../errors';

/** Gathers what is wrong with a scenario, each at the path of the form where it is mended. */
export class Findings {
  readonly faults: Fault[] = [];
  readonly doubts: Fault[] = [];

  fault(path: string, message: string) {
    this.faults.push({ path, message });
  }

  doubt(path: string, message: string) {
    this.doubts.push({ path, message });
  }

  /** A number that must be there and within bounds; true where it is. */
  number(
    path: string,
    value: number | null,
    missing: string,
    bad?: { when: (value: number) => boolean; say: string },
  ): value is number {
    if (value === null || !Number.isFinite(value)) this.fault(path, missing);
    else if (bad?.when(value)) this.fault(path, bad.say);
    else return true;
    return false;
  }
}
