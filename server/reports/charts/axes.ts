import type { Frame } from '../../../components/charts/geometry/frame';
import { tickDecimals, type TimeTicks } from '../../../components/charts/geometry/ticks';
import { formatNumber } from '../../../shared/units/format';
import { COLOUR } from '../pdf/colours';
import { FONT } from '../pdf/sheet';

type Doc = PDFKit.PDFDocument;
const SIZE = 7.5;
const LABEL = 60;

export interface Axis {
  ticks: readonly number[];
  label: (tick: number) => string;
  title: string;
}

/** An axis of plain numbers with the digits that tell its ticks apart. */
export function numberAxis(ticks: readonly number[], title: string): Axis {
  const decimals = tickDecimals(ticks);
  return { ticks, title, label: (tick) => formatNumber(tick, decimals) };
}

export const timeAxis = ({ values, unit, unitSeconds }: TimeTicks): Axis => ({
  ticks: values,
  label: (tick) => formatNumber(tick / unitSeconds, 0),
  title: `time from start (${unit})`,
});

/** Hairlines with their values, and what they count in: upright at the top left, along at the foot. */
export function axes(doc: Doc, frame: Frame, x: Axis, y: Axis): void {
  const { left, right, top, bottom } = frame;
  doc.lineWidth(0.4);
  for (const tick of y.ticks)
    doc.moveTo(left, frame.y(tick)).lineTo(right, frame.y(tick)).stroke(COLOUR.line);
  doc.lineWidth(0.75).moveTo(left, bottom).lineTo(right, bottom).stroke(COLOUR.edge);
  for (const tick of x.ticks)
    doc
      .moveTo(frame.x(tick), bottom)
      .lineTo(frame.x(tick), bottom + 3)
      .stroke(COLOUR.edge);

  doc.font(FONT.regular).fontSize(SIZE).fillColor(COLOUR.soft);
  for (const tick of y.ticks)
    doc.text(y.label(tick), left - 4 - LABEL, frame.y(tick) - SIZE * 0.62, {
      width: LABEL,
      align: 'right',
      lineBreak: false,
      features: ['tnum'],
    });
  for (const tick of x.ticks)
    doc.text(x.label(tick), frame.x(tick) - LABEL / 2, bottom + 4, {
      width: LABEL,
      align: 'center',
      lineBreak: false,
      features: ['tnum'],
    });
  doc.text(y.title, left - 40, top - 20, { lineBreak: false });
  doc.text(x.title, left, bottom + 14, { width: right - left, align: 'right', lineBreak: false });
}

/** A line in its own stroke with a word for it, along the top of a drawing. */
export interface LegendEntry {
  word: string;
  sample: (doc: Doc, x: number, y: number, length: number) => void;
}

export function legend(doc: Doc, right: number, y: number, entries: readonly LegendEntry[]): void {
  const sample = 16;
  doc.font(FONT.regular).fontSize(SIZE);
  const widths = entries.map(({ word }) => sample + 4 + doc.widthOfString(word));
  let x = right - widths.reduce((sum, width) => sum + width + 12, -12);
  entries.forEach((entry, k) => {
    entry.sample(doc, x, y, sample);
    doc
      .font(FONT.regular)
      .fontSize(SIZE)
      .fillColor(COLOUR.ink)
      .text(entry.word, x + sample + 4, y - SIZE * 0.62, { lineBreak: false });
    x += widths[k] + 12;
  });
}

/** How a line is drawn: they are told apart without colour. */
export interface Pen {
  colour: string;
  width: number;
  dash?: [number, number];
}

export function strokePath(doc: Doc, path: string, { colour, width, dash }: Pen): void {
  if (!path) return;
  doc.save().lineWidth(width);
  if (dash) doc.dash(dash[0], { space: dash[1] });
  doc.path(path).stroke(colour).restore();
}

export const penSample =
  (pen: Pen): LegendEntry['sample'] =>
  (doc, x, y, length) =>
    strokePath(doc, `M${x},${y}L${x + length},${y}`, pen);
