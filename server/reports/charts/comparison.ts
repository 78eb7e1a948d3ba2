import {
  comparisonModel,
  type ComparedQuantity,
} from '../../../components/charts/geometry/comparisonModel';
import type { CaseCurves } from '../../../shared/verificationCases/types';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { axes, legend, numberAxis, penSample, strokePath, timeAxis, type Pen } from './axes';

const EXACT: Pen = { colour: COLOUR.ink, width: 1 };
const DOT = 1.7;

/** Computed values as dots over the exact line, with the ground where there is one. */
export const comparison = (
  title: string,
  curves: CaseCurves,
  quantity: ComparedQuantity,
): Drawing => ({
  alt: `${title}: ${quantity} along the ${curves.along}, computed over exact.`,
  draw(doc, size) {
    const model = comparisonModel(size, curves, quantity);
    const { frame, time, xTicks, yTicks } = model;
    axes(
      doc,
      frame,
      time ? timeAxis(time) : numberAxis(xTicks, 'chainage (m), downstream to the right'),
      numberAxis(yTicks, quantity === 'stage' ? 'stage (m)' : 'flow (m³/s)'),
    );
    if (model.water) doc.path(model.water).fill(COLOUR.waterTint);
    if (model.ground) doc.path(model.ground).fill(COLOUR.earthTint);
    strokePath(doc, model.groundLine, { colour: COLOUR.earth, width: 0.8 });
    for (const [from, to] of model.leftOut)
      doc.rect(from, frame.bottom - 3, to - from, 3).fill(COLOUR.ochre);
    strokePath(doc, model.exact, EXACT);
    for (const { x, y } of model.dots) ring(doc, x, y);
    legend(doc, frame.right, 8, [
      { word: 'exact', sample: penSample(EXACT) },
      { word: 'computed', sample: (_doc, x, y, length) => ring(doc, x + length / 2, y) },
    ]);
  },
});

const ring = (doc: PDFKit.PDFDocument, x: number, y: number) =>
  doc.circle(x, y, DOT).lineWidth(0.7).fillAndStroke('#FFFFFF', COLOUR.water);
