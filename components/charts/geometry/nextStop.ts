import { nearestIndex } from './interpolate';

/** Where a key on a slider leads among rising stops; null for a key that is not ours. */
export function nextStop(
  stops: readonly number[],
  at: number,
  key: string,
  page = 5,
): number | null {
  if (!stops.length) return null;
  const last = stops.length - 1;
  const nearest = nearestIndex(stops, at);
  // From between two stops a step leads to the neighbour, not past it.
  const up = stops[nearest] > at ? nearest : nearest + 1;
  const down = stops[nearest] < at ? nearest : nearest - 1;
  const to: Record<string, number> = {
    ArrowRight: up,
    ArrowUp: up,
    ArrowLeft: down,
    ArrowDown: down,
    PageUp: nearest + page,
    PageDown: nearest - page,
    Home: 0,
    End: last,
  };
  return key in to ? stops[Math.max(0, Math.min(last, to[key]))] : null;
}
