import { hydrographModel } from '../../../components/charts/geometry/hydrographModel';
import type { GaugeFit } from '../../../shared/calibration/types';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { axes, legend, numberAxis, penSample, strokePath, timeAxis } from './axes';

const COMPUTED = { colour: COLOUR.water, width: 1.3 };
const OBSERVED = { colour: COLOUR.ink, width: 0.8 };

/** The record of a gauge as crosses, what was computed at its times as a line. */
export const observedGauge = (
  name: string,
  { times, observed, computed }: NonNullable<GaugeFit['series']>,
  quantity: 'stage' | 'flow',
  system: UnitSystem,
): Drawing => ({
  alt: `${name}: observed ${quantity} as crosses, computed as a line.`,
  draw(doc, size) {
    const kind = quantity === 'stage' ? 'elevation' : 'flow';
    const model = hydrographModel(
      size,
      { times, values: computed },
      { times, values: observed },
      kind,
      system,
    );
    const { frame, main, compare, timeTicks, valueTicks } = model;
    axes(
      doc,
      frame,
      timeAxis(timeTicks),
      numberAxis(valueTicks, `${quantity} (${UNITS[system][kind].symbol})`),
    );
    strokePath(doc, main.path, COMPUTED);
    const crosses = Array.from(compare!.x, (x, i) => {
      const y = compare!.y[i];
      return `M${x - 2},${y - 2}L${x + 2},${y + 2}M${x + 2},${y - 2}L${x - 2},${y + 2}`;
    });
    strokePath(doc, crosses.join(''), OBSERVED);
    legend(doc, frame.right, 6, [
      { word: 'computed', sample: penSample(COMPUTED) },
      { word: 'observed, crosses', sample: penSample(OBSERVED) },
    ]);
  },
});
