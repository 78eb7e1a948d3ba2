import { COLOUR } from './colours';
import { FONT, room, type Sheet } from './sheet';

const LINE_GAP = 2.5;

/** Runs `draw` as a tagged piece of the document, in reading order. */
export function tagged({ doc }: Sheet, type: string, draw: () => void): void {
  doc.addStructure(doc.struct(type, {}, [draw]));
}

/** Less than this share of a page left: a part begins on the next one. */
const SHORT = 0.45;

/** Begins a part, with a bookmark: below the one before where there is room, or on a new page. */
export function partHeading(sheet: Sheet, text: string, where: 'flowing' | 'newPage'): void {
  const { doc, left, right, top, bottom } = sheet;
  if (where === 'newPage' || bottom - doc.y < SHORT * (bottom - top)) doc.addPage();
  else if (doc.y > top) doc.y += 20;
  doc.x = left;
  doc.outline.addItem(text);
  tagged(sheet, 'H1', () => doc.font(FONT.semibold).fontSize(20).fillColor(COLOUR.ink).text(text));
  doc.markContent('Artifact', { type: 'Layout' });
  const y = doc.y + 4;
  doc.moveTo(left, y).lineTo(right, y).lineWidth(0.75).stroke(COLOUR.line);
  doc.endMarkedContent();
  doc.y += 16;
  doc.x = left;
}

/** A heading within a part; it does not stand alone at the foot of a page. */
export function heading(sheet: Sheet, text: string, follows = 60): void {
  const { doc } = sheet;
  doc.y += 8;
  room(sheet, 22 + follows);
  tagged(sheet, 'H2', () =>
    doc.font(FONT.semibold).fontSize(12.5).fillColor(COLOUR.ink).text(text, { width: sheet.width }),
  );
  doc.y += 3;
}

interface Style {
  size?: number;
  colour?: string;
  bold?: boolean;
  /** Space below. */
  after?: number;
}

export function paragraph(sheet: Sheet, text: string, style: Style = {}): void {
  const { size = 10, colour = COLOUR.ink, bold = false, after = 7 } = style;
  const { doc, width } = sheet;
  room(sheet, 2 * size);
  for (const part of text.split(/\n+/)) {
    tagged(sheet, 'P', () =>
      doc
        .font(bold ? FONT.semibold : FONT.regular)
        .fontSize(size)
        .fillColor(colour)
        .text(part, { width, lineGap: LINE_GAP }),
    );
  }
  doc.y += after;
}

/** Small print: sources, what a table means. */
export const note = (sheet: Sheet, text: string): void =>
  paragraph(sheet, text, { size: 8.5, colour: COLOUR.soft, after: 8 });

/** Lines with a dash, each one piece. */
export function list(sheet: Sheet, lines: readonly string[]): void {
  const { doc, left, width } = sheet;
  const indent = 12;
  for (const line of lines) {
    doc.font(FONT.regular).fontSize(10);
    room(
      sheet,
      Math.min(200, doc.heightOfString(line, { width: width - indent, lineGap: LINE_GAP })),
    );
    tagged(sheet, 'P', () => {
      const y = doc.y;
      doc.fillColor(COLOUR.soft).text('–', left, y, { width: indent });
      doc
        .fillColor(COLOUR.ink)
        .text(line, left + indent, y, { width: width - indent, lineGap: LINE_GAP });
    });
    doc.x = left;
    doc.y += 4;
  }
  doc.y += 4;
}

/** A framed note that must not be passed over. */
export function notice(sheet: Sheet, text: string, tone: 'ochre' | 'brick'): void {
  const { doc, left, width } = sheet;
  const pad = 10;
  doc.font(FONT.semibold).fontSize(10);
  const height =
    doc.heightOfString(text, { width: width - 2 * pad - 4, lineGap: LINE_GAP }) + 2 * pad;
  room(sheet, height + 8);
  const y = doc.y;
  doc.markContent('Artifact', { type: 'Layout' });
  doc.rect(left, y, width, height).fill(COLOUR[`${tone}Tint`]);
  doc.rect(left, y, 4, height).fill(COLOUR[tone]);
  doc.endMarkedContent();
  tagged(sheet, 'P', () =>
    doc
      .fillColor(COLOUR[tone])
      .text(text, left + pad + 4, y + pad, { width: width - 2 * pad - 4, lineGap: LINE_GAP }),
  );
  doc.x = left;
  doc.y = y + height + 12;
}
