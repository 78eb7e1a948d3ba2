import { COMPARED_RUNS } from '@/shared/comparison/schemas';

/** Runs as the address has them; what cannot be one, stands twice, or is too many is left out. */
export function readRunIds(text: string | undefined): number[] {
  const ids = (text ?? '').split(',').map(Number);
  const runs = ids.filter((id) => Number.isInteger(id) && id > 0);
  return [...new Set(runs)].slice(0, COMPARED_RUNS.max);
}

/** With one more, or one less. */
export const toggled = (ids: readonly number[], id: number): number[] =>
  ids.includes(id) ? ids.filter((other) => other !== id) : [...ids, id];
