import { hydrographModel, type Series } from '../../../components/charts/geometry/hydrographModel';
import { formatDuration, formatWithUnit } from '../../../shared/units/format';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';
import { crosses } from './crosses';
import { axes, numberAxis, strokePath, timeAxis } from './axes';

const WORDS = { elevation: 'stage', flow: 'flow' } as const;

/** A quantity against time under its name and its peak, which is that of every time step; what was observed as crosses. */
export const hydrograph = (
  title: string,
  series: Series,
  peak: { value: number; time: number },
  quantity: 'elevation' | 'flow',
  system: UnitSystem,
  observed: Series | null = null,
): Drawing => {
  const word = WORDS[quantity];
  const highest = `highest ${formatWithUnit(peak.value, quantity, system)} at ${formatDuration(peak.time)}`;
  return {
    alt: `${title}: ${word} against time, ${highest}${observed ? '; observed as crosses' : ''}.`,
    draw(doc, size) {
      const head = { width: size.width, height: size.height - HEAD };
      const model = hydrographModel(head, series, null, quantity, system, { observed });
      const { frame, main, timeTicks } = model;
      doc.save().translate(0, HEAD);
      axes(
        doc,
        frame,
        timeAxis(timeTicks),
        numberAxis(model.valueTicks, `${word} (${UNITS[system][quantity].symbol})`),
      );
      strokePath(doc, main.path, { colour: COLOUR.water, width: 1.3 });
      if (model.observed) crosses(doc, model.observed);
      doc.circle(frame.x(peak.time), model.yOf(peak.value), 2.2).fill(COLOUR.water);
      const line = {
        width: frame.right - frame.left - 44,
        align: 'right',
        lineBreak: false,
      } as const;
      doc.font(FONT.semibold).fontSize(8.5).fillColor(COLOUR.ink);
      doc.text(observed ? `${title} (observed: crosses)` : title, frame.left + 44, frame.top - 30, {
        ...line,
        ellipsis: true,
      });
      doc.font(FONT.regular).fontSize(8);
      doc.text(highest, frame.left + 44, frame.top - 19, line);
      doc.restore();
    },
  };
};

/** Room above the plot for the name, beside that which the geometry leaves. */
const HEAD = 8;
