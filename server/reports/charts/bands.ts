import {
  bandModel,
  type BandAxis,
  type BandData,
} from '../../../components/charts/geometry/bandModel';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';
import { axes, legend, numberAxis, penSample, strokePath, timeAxis, type Pen } from './axes';

const MEDIAN: Pen = { colour: COLOUR.water, width: 1.3 };
const BASE: Pen = { colour: COLOUR.soft, width: 0.8, dash: [4, 3] };
const EDGE: Pen = { colour: COLOUR.water, width: 0.5 };
const WORDS = { elevation: 'stage', flow: 'flow', depth: 'difference' } as const;

/** A curve within its band, under its name. */
export const bands = (
  title: string,
  data: BandData,
  axis: BandAxis,
  quantity: 'elevation' | 'flow' | 'depth',
  system: UnitSystem,
): Drawing => ({
  alt: `${title}: the median and the band from 5 to 95 of 100 members.`,
  draw(doc, size) {
    const model = bandModel(
      { width: size.width, height: size.height - HEAD },
      data,
      axis,
      quantity,
      system,
    );
    const { frame, timeTicks, placeTicks } = model;
    doc.save().translate(0, HEAD);
    axes(
      doc,
      frame,
      timeTicks
        ? timeAxis(timeTicks)
        : numberAxis(placeTicks, `chainage (${UNITS[system].chainage.symbol})`),
      numberAxis(model.valueTicks, `${WORDS[quantity]} (${UNITS[system][quantity].symbol})`),
    );
    if (model.band) doc.path(model.band).fill(COLOUR.waterTint);
    if (model.ground) {
      doc.path(model.ground.fill).fill(COLOUR.earthTint);
      strokePath(doc, model.ground.edge, { colour: COLOUR.ink, width: 0.8 });
    }
    if (model.compare) strokePath(doc, model.compare.path, BASE);
    if (model.band) strokePath(doc, model.band, EDGE);
    strokePath(doc, model.line.path, MEDIAN);
    if (model.compare)
      legend(doc, frame.right, frame.top - 6, [
        { word: '50 %', sample: penSample(MEDIAN) },
        { word: 'base case', sample: penSample(BASE) },
      ]);
    doc.font(FONT.semibold).fontSize(8.5).fillColor(COLOUR.ink);
    doc.text(title, frame.left + 30, frame.top - 30, {
      width: frame.right - frame.left - 30,
      align: 'right',
      lineBreak: false,
      ellipsis: true,
    });
    doc.restore();
  },
});

/** Room above the plot for the name. */
const HEAD = 10;
