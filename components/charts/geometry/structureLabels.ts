import type { Frame } from './frame';
import { textWidth } from './textWidth';

interface Named {
  x: number;
  /** Top of the structure, px. */
  y: number;
  text: string;
}

export interface StructureLabel {
  text: string;
  x: number;
  /** Base line. */
  y: number;
  /** The point that it names. */
  fromX: number;
  fromY: number;
}

const SIZE = 12.5;
const LINE = 16;
const GAP = 6;

/** Names above their structures within the drawing; where two would run into each other the later one stands higher. */
export function structureLabels(named: readonly Named[], frame: Frame): StructureLabel[] {
  const placed: (StructureLabel & { right: number })[] = [];
  for (const { x, y, text } of [...named].sort((a, b) => a.x - b.x)) {
    const width = textWidth(text, SIZE);
    const left = Math.min(Math.max(x - width / 2, frame.left), frame.right - width);
    let base = Math.max(y - 8, frame.top + LINE);
    const runsInto = () =>
      placed.some(
        (other) =>
          left < other.right + GAP &&
          left + width + GAP > other.x &&
          Math.abs(base - other.y) < LINE,
      );
    while (runsInto() && base > frame.top + LINE) base -= LINE;
    if (runsInto()) continue;
    placed.push({ text, x: left, y: base, fromX: x, fromY: y, right: left + width });
  }
  return placed.map(({ right: _right, ...label }) => label);
}
