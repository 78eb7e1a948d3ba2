import { scaleLinear } from 'd3-scale';
import { tornadoModel, type TornadoBar } from '../../../components/charts/geometry/tornadoModel';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';

const ROW = 34;
const TOP = 22;
const SIZE = 8;

export const tornadoHeight = (bars: readonly TornadoBar[]): number => TOP + ROW * bars.length + 4;

/** What each input changes by itself, the largest first: an open bar for its lower value, a full one for its upper. */
export const tornado = (
  title: string,
  bars: readonly TornadoBar[],
  format: (change: number) => string,
): Drawing => ({
  alt: `${title}: what each input changes by itself; the numbers are in the table.`,
  draw(doc, { width }) {
    const { rows, extent } = tornadoModel(bars);
    const [low, high] = extent;
    const words = ({ words: what, change }: TornadoBar['low']) =>
      `${what}: ${change === null ? 'no result' : format(change)}`;
    doc.font(FONT.regular).fontSize(SIZE);
    const room =
      8 +
      Math.max(
        ...rows.flatMap((row) => [row.low, row.high].map((s) => doc.widthOfString(words(s)))),
      );
    const x = scaleLinear(low === high ? [0, 1] : [low, high], [low < 0 ? room : 4, width - room]);
    doc.font(FONT.semibold).fontSize(8.5).fillColor(COLOUR.ink);
    doc.text(title, 0, 0, { width, lineBreak: false, ellipsis: true });
    rows.forEach((row, k) => {
      const y = TOP + ROW * k;
      doc.font(FONT.semibold).fontSize(SIZE).fillColor(COLOUR.ink);
      doc.text(row.label, 0, y - 4, { lineBreak: false });
      [row.low, row.high].forEach((side, s) => {
        const top = y + 7 + s * 11;
        const change = side.change ?? 0;
        const [from, to] = [x(Math.min(0, change)), x(Math.max(0, change))];
        doc.rect(from, top, Math.max(0.5, to - from), 8).lineWidth(0.8);
        if (s === 0) doc.fillAndStroke(COLOUR.card, COLOUR.water);
        else doc.fillAndStroke(COLOUR.water, COLOUR.water);
        doc.font(FONT.regular).fontSize(SIZE).fillColor(COLOUR.soft);
        const text = words(side);
        const at = change < 0 ? from - 4 - doc.widthOfString(text) : to + 4;
        doc.text(text, at, top - 1, { lineBreak: false });
      });
    });
    doc
      .moveTo(x(0), TOP + 4)
      .lineTo(x(0), TOP + ROW * rows.length)
      .lineWidth(0.8)
      .stroke(COLOUR.ink);
  },
});
