import { partsOf, q, say, type Said } from '../../shared/units/message';
import { SaidError } from '../../shared/units/SaidError';

/** The run could not go on: says where and when, why, and what to change. */
export class RunFailed extends SaidError {
  constructor(
    reason: string | Said,
    /** s from the start */
    readonly time: number,
    /** m; null where no place is to blame */
    readonly chainage: number | null,
  ) {
    const why = typeof reason === 'string' ? reason : partsOf(reason);
    const place =
      chainage === null
        ? ''
        : partsOf(say` at chainage ${q(chainage, 'chainage', { decimals: 1 })}`);
    super(say`The run failed${place} at ${time.toFixed(1)} s: ${why}`);
    this.name = 'RunFailed';
  }
}

/** The caller asked the run to stop. */
export class RunCancelled extends Error {
  constructor(readonly time: number) {
    super(`The run was cancelled at ${time.toFixed(1)} s of model time.`);
    this.name = 'RunCancelled';
  }
}
