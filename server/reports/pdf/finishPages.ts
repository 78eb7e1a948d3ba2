import type { Standing } from '../types';
import { COLOUR } from './colours';
import { FONT, type Sheet } from './sheet';

const MARKS: Record<Standing, { word: string; line: string } | null> = {
  preliminary: { word: 'PRELIMINARY', line: 'PRELIMINARY – not signed, not to be relied on' },
  signed: null,
  withdrawn: { word: 'WITHDRAWN', line: 'WITHDRAWN – not to be relied on' },
};

/** Foot lines with n of m, and the mark across every page that does not stand as signed; null: of what nobody signs. */
export function finishPages(sheet: Sheet, standing: Standing | null, foot: string): void {
  const { doc, left, width } = sheet;
  const { start, count } = doc.bufferedPageRange();
  const mark = standing && MARKS[standing];
  for (let k = 0; k < count; k++) {
    doc.switchToPage(start + k);
    // Text below the margin would otherwise begin a page.
    doc.page.margins.bottom = 0;
    const { height } = doc.page;
    doc.markContent('Artifact', { type: 'Pagination' });
    doc.font(FONT.regular).fontSize(8.5).fillColor(COLOUR.soft);
    doc.text(foot, left, height - 42, { width: width - 80, lineBreak: false, ellipsis: true });
    doc.text(`${k + 1} of ${count}`, left, height - 42, {
      width,
      align: 'right',
      lineBreak: false,
      features: ['tnum'],
    });
    if (mark) {
      doc.font(FONT.semibold).fillColor(COLOUR.brick);
      doc.fontSize(8.5).text(mark.line, left, 30, { width, align: 'center', lineBreak: false });
      across(sheet, mark.word);
    }
    doc.endMarkedContent();
  }
}

/** One word from corner to corner, light enough to read through. */
function across({ doc }: Sheet, word: string): void {
  const { width, height } = doc.page;
  const size = 88;
  doc.fontSize(size);
  const length = doc.widthOfString(word);
  doc.save();
  doc.rotate(-55, { origin: [width / 2, height / 2] });
  doc.fillOpacity(0.13);
  doc.text(word, width / 2 - length / 2, height / 2 - size * 0.62, { lineBreak: false });
  doc.restore();
  doc.fillOpacity(1);
}
