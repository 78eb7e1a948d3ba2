/** One input: what its lower and its upper value change, SI; null where that side has no result. */
export interface TornadoBar {
  label: string;
  low: { words: string; change: number | null };
  high: { words: string; change: number | null };
}

export interface TornadoRow extends TornadoBar {
  /** Largest change either way. */
  reach: number;
}

/** The inputs by what they change, the largest first; the common extent to draw them on, which always holds 0. */
export function tornadoModel(bars: readonly TornadoBar[]): {
  rows: TornadoRow[];
  extent: [number, number];
} {
  const size = (change: number | null) => Math.abs(change ?? 0);
  const rows = bars
    .map((bar) => ({ ...bar, reach: Math.max(size(bar.low.change), size(bar.high.change)) }))
    .sort((a, b) => b.reach - a.reach);
  const changes = bars.flatMap(({ low, high }) => [low.change ?? 0, high.change ?? 0]);
  return { rows, extent: [Math.min(0, ...changes), Math.max(0, ...changes)] };
}
