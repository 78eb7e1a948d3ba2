import path from 'node:path';
import PDFDocument from 'pdfkit';
import type { Paper } from '../../../shared/reports/types';
import { COLOUR } from './colours';

/** An open document and where on its pages things stand. Lengths in points (1/72 inch), y downwards. */
export interface Sheet {
  doc: PDFKit.PDFDocument;
  left: number;
  right: number;
  width: number;
  top: number;
  /** Nothing of the text stands below. */
  bottom: number;
}

export const FONT = { regular: 'regular', semibold: 'semibold' } as const;
const MARGIN = 54;
const FOOT = 64;

const fontFile = (weight: string) =>
  require.resolve(
    path.posix.join('@expo-google-fonts/source-sans-3', weight, `SourceSans3_${weight}.ttf`),
  );

export interface About {
  title: string;
  author: string;
  subject: string;
  /** The only date in the file: with it the same facts give the same bytes. */
  date: Date;
}

/** A tagged document in English that opens with its title; nothing in it depends on the clock or on chance. */
export function openSheet(paper: Paper, { title, author, subject, date }: About): Sheet {
  const doc = new PDFDocument({
    size: paper,
    margins: { top: MARGIN, left: MARGIN, right: MARGIN, bottom: FOOT },
    autoFirstPage: false,
    bufferPages: true,
    pdfVersion: '1.7',
    tagged: true,
    lang: 'en-GB',
    displayTitle: true,
    info: {
      Title: title,
      Author: author,
      Subject: subject,
      Creator: 'Spate',
      Producer: 'Spate',
      CreationDate: date,
      ModDate: date,
    },
  });
  doc.registerFont(FONT.regular, fontFile('400Regular'));
  doc.registerFont(FONT.semibold, fontFile('600SemiBold'));
  doc.addPage();
  doc.font(FONT.regular).fillColor(COLOUR.ink);
  const { width, height } = doc.page;
  return {
    doc,
    left: MARGIN,
    right: width - MARGIN,
    width: width - 2 * MARGIN,
    top: MARGIN,
    bottom: height - FOOT,
  };
}

/** Turns the page where less than `height` is left. */
export function room({ doc, bottom, left }: Sheet, height: number): void {
  if (doc.y + height > bottom) doc.addPage();
  doc.x = left;
}

/** The finished bytes. */
export function closeSheet({ doc }: Sheet): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const pieces: Buffer[] = [];
    doc.on('data', (piece: Buffer) => pieces.push(piece));
    doc.on('end', () => resolve(Buffer.concat(pieces)));
    doc.on('error', reject);
    doc.end();
  });
}
