/** The run could not go on: says where and when, why, and what to change. */
export class RunFailed extends Error {
  constructor(
    reason: string,
    /** s from the start */
    readonly time: number,
    /** m; null where no place is to blame */
    readonly chainage: number | null,
  ) {
    const place = chainage === null ? '' : ` at chainage ${chainage.toFixed(1)} m`;
    super(`The run failed${place} at ${time.toFixed(1)} s: ${reason}`);
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
