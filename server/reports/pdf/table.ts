import { COLOUR } from './colours';
import { FONT, type Sheet } from './sheet';

export interface Column {
  heading: string;
  /** Share of the width. */
  share: number;
  /** Numbers stand to the right and line up. */
  align?: 'left' | 'right';
}

const SIZE = 9;
const PAD = 4;

/** A table over the whole width; its headings come again on every page. Rows are not torn. */
export function table(
  sheet: Sheet,
  columns: readonly Column[],
  rows: readonly (readonly string[])[],
): void {
  const { doc, left, width, bottom } = sheet;
  const whole = columns.reduce((sum, { share }) => sum + share, 0);
  const widths = columns.map(({ share }) => (share / whole) * width);
  const lefts = widths.map((_, k) => left + widths.slice(0, k).reduce((a, b) => a + b, 0));
  const element = doc.struct('Table');
  doc.addStructure(element);

  const heightOf = (cells: readonly string[], font: string) => {
    doc.font(font).fontSize(SIZE);
    const heights = cells.map((text, k) =>
      doc.heightOfString(text || ' ', { width: widths[k] - 2 * PAD, features: ['tnum'] }),
    );
    return Math.max(...heights) + 2 * PAD;
  };
  const cell = (text: string, k: number, y: number, font: string, colour: string) =>
    doc
      .font(font)
      .fontSize(SIZE)
      .fillColor(colour)
      .text(text, lefts[k] + PAD, y + PAD, {
        width: widths[k] - 2 * PAD,
        align: columns[k].align ?? 'left',
        features: ['tnum'],
      });
  const rule = (y: number, colour: string, lineWidth: number) => {
    doc.markContent('Artifact', { type: 'Layout' });
    doc
      .moveTo(left, y)
      .lineTo(left + width, y)
      .lineWidth(lineWidth)
      .stroke(colour);
    doc.endMarkedContent();
  };

  const headings = columns.map((column) => column.heading);
  const headHeight = headings.some(Boolean) ? heightOf(headings, FONT.semibold) : 0;
  const head = (again: boolean) => {
    if (headHeight === 0) return;
    const y = doc.y;
    if (again) {
      doc.markContent('Artifact', { type: 'Layout' });
      headings.forEach((text, k) => cell(text, k, y, FONT.semibold, COLOUR.soft));
      doc.endMarkedContent();
    } else {
      const row = doc.struct('TR');
      element.add(row);
      headings.forEach((text, k) =>
        row.add(doc.struct('TH', {}, [() => cell(text, k, y, FONT.semibold, COLOUR.soft)])),
      );
      row.end();
    }
    doc.y = y + headHeight;
    rule(doc.y, COLOUR.edge, 0.75);
  };

  const heights = rows.map((cells) => heightOf(cells, FONT.regular));
  if (doc.y + headHeight + (heights[0] ?? 0) > bottom) doc.addPage();
  head(false);
  rows.forEach((cells, r) => {
    if (doc.y + heights[r] > bottom) {
      doc.addPage();
      head(true);
    }
    const y = doc.y;
    const row = doc.struct('TR');
    element.add(row);
    cells.forEach((text, k) => {
      const first = k === 0 && headHeight === 0;
      row.add(
        doc.struct(first ? 'TH' : 'TD', {}, [
          () => cell(text, k, y, FONT.regular, first ? COLOUR.soft : COLOUR.ink),
        ]),
      );
    });
    row.end();
    doc.y = y + heights[r];
    rule(doc.y, COLOUR.line, 0.5);
  });
  element.end();
  doc.x = left;
  doc.y += 12;
}

/** What and how much, a line each. */
export const facts = (sheet: Sheet, rows: readonly (readonly [string, string])[]): void =>
  table(
    sheet,
    [
      { heading: '', share: 3 },
      { heading: '', share: 7 },
    ],
    rows,
  );
