import type { ReachRow } from './types';

/** The reach of the newest survey as it was surveyed: what is shown and routed until a working geometry is chosen. */
export const newestReach = <R extends Pick<ReachRow, 'revision' | 'copiedFrom'>>(
  rows: readonly R[],
): R | undefined =>
  rows
    .filter(({ copiedFrom }) => copiedFrom === null)
    .reduce<R | undefined>(
      (best, row) => (best && best.revision >= row.revision ? best : row),
      undefined,
    );
