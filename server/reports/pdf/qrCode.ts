import QRCode from 'qrcode';
import { COLOUR } from './colours';

/** A QR code (ISO/IEC 18004) of a text as squares, `size` points wide, from a corner. Four modules of quiet ground. */
export function qrCode(doc: PDFKit.PDFDocument, text: string, x: number, y: number, size: number) {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' });
  const quiet = 4;
  const step = size / (modules.size + 2 * quiet);
  doc.rect(x, y, size, size).fill('#FFFFFF');
  for (let row = 0; row < modules.size; row++)
    for (let column = 0; column < modules.size; column++)
      if (modules.get(row, column))
        doc.rect(x + (column + quiet) * step, y + (row + quiet) * step, step, step);
  doc.fill(COLOUR.ink);
}
