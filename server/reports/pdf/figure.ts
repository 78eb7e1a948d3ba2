import { COLOUR } from './colours';
import { FONT, room, type Sheet } from './sheet';
import { tagged } from './writing';

export interface Size {
  width: number;
  height: number;
}

/** One drawing: it is drawn from its own corner, and told in words to those who cannot see it. */
export interface Drawing {
  alt: string;
  draw: (doc: PDFKit.PDFDocument, size: Size) => void;
}

const GAP = 14;

/** One drawing over the whole width, or several beside each other, with a caption below; empty: it says all itself. */
export function figure(
  sheet: Sheet,
  drawings: readonly Drawing[],
  height: number,
  caption: string,
  across = drawings.length,
): void {
  const { doc, left, width } = sheet;
  doc.font(FONT.regular).fontSize(8.5);
  const captionHeight = caption ? doc.heightOfString(caption, { width }) : 0;
  room(sheet, height + captionHeight + 14);
  const y = doc.y;
  const each = (width - GAP * (across - 1)) / across;
  drawings.forEach(({ alt, draw }, k) => {
    const x = left + k * (each + GAP);
    const about = { alt, bbox: [x, y, x + each, y + height], placement: 'Block' };
    doc.addStructure(
      doc.struct('Figure', about, [
        () => {
          doc.save().translate(x, y);
          draw(doc, { width: each, height });
          doc.restore();
        },
      ]),
    );
  });
  doc.x = left;
  doc.y = y + height + 4;
  if (caption)
    tagged(sheet, 'Caption', () =>
      doc.font(FONT.regular).fontSize(8.5).fillColor(COLOUR.soft).text(caption, { width }),
    );
  doc.y += caption ? 12 : 6;
}
