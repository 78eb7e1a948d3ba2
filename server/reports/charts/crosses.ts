import { COLOUR } from '../pdf/colours';
import { strokePath, type LegendEntry, type Pen } from './axes';

const PEN: Pen = { colour: COLOUR.ink, width: 0.8 };
const ARM = 2;

const cross = (x: number, y: number) =>
  `M${x - ARM},${y - ARM}l${2 * ARM},${2 * ARM}M${x - ARM},${y + ARM}l${2 * ARM},${-2 * ARM}`;

/** What was observed: a cross a value, px; `bars` from above to below each where it is allowed that much. */
export function crosses(
  doc: PDFKit.PDFDocument,
  { x, y, bars }: { x: ArrayLike<number>; y: ArrayLike<number>; bars?: [number, number][] },
): void {
  const path = Array.from(x, (px, k) => {
    const bar = bars ? `M${px},${bars[k][0]}V${bars[k][1]}` : '';
    return cross(px, y[k]) + bar;
  });
  strokePath(doc, path.join(''), PEN);
}

export const crossEntry: LegendEntry = {
  word: 'observed, crosses',
  sample: (doc, x, y, length) => crosses(doc, { x: [x + length / 2], y: [y] }),
};
