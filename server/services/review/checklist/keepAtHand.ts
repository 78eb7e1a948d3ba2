import type { RunModel } from '../../../models/Run';

/** Runs that are kept at hand: what is read of a routed run never changes. */
const KEPT = 60;

/** Reads once a run, and forgets the one that was read first where there are too many. */
export function keepAtHand<T>(read: (run: RunModel) => Promise<T>): (run: RunModel) => Promise<T> {
  const kept = new Map<number, Promise<T>>();
  return (run) => {
    const known = kept.get(run.id);
    if (known) return known;
    const reading = read(run);
    kept.set(run.id, reading);
    reading.catch(() => kept.delete(run.id));
    if (kept.size > KEPT) kept.delete(kept.keys().next().value!);
    return reading;
  };
}
