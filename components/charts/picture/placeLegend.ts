import { textWidth } from '../geometry/textWidth';

/** A curve as it is drawn, and its name. */
export interface LegendEntry {
  swatch: SVGSVGElement;
  words: string;
}

interface PlacedEntry extends LegendEntry {
  /** px from the left. */
  x: number;
  line: number;
  /** Of the swatch with the gap behind it, px. */
  width: number;
}

const GAP = { words: 8, entries: 18 };

/** One entry after the other, on as many lines as they need. */
export function placeLegend(
  legend: readonly LegendEntry[],
  room: number,
  fontSize: number,
): { entries: PlacedEntry[]; lines: number } {
  let x = 0;
  let line = 0;
  const entries = legend.map((entry): PlacedEntry => {
    const width = (Number.parseFloat(entry.swatch.getAttribute('width') ?? '') || 0) + GAP.words;
    const whole = width + textWidth(entry.words, fontSize);
    if (x > 0 && x + whole > room) {
      x = 0;
      line += 1;
    }
    const placed = { ...entry, x, line, width };
    x += whole + GAP.entries;
    return placed;
  });
  return { entries, lines: legend.length > 0 ? line + 1 : 0 };
}

/** The entries of a legend that stands on the page. */
export const legendOf = (legend: Element | null): LegendEntry[] =>
  [...(legend?.querySelectorAll('[role="listitem"]') ?? [])].flatMap((item) => {
    const swatch = item.querySelector('svg');
    return swatch ? [{ swatch, words: item.textContent?.trim() ?? '' }] : [];
  });
