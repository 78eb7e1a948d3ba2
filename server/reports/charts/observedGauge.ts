import { hydrographModel } from '../../../components/charts/geometry/hydrographModel';
import type { GaugeFit } from '../../../shared/calibration/types';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { crossEntry, crosses } from './crosses';
import { axes, legend, numberAxis, penSample, strokePath, timeAxis } from './axes';

const COMPUTED = { colour: COLOUR.water, width: 1.3 };

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
    const model = hydrographModel(size, { times, values: computed }, null, kind, system, {
      observed: { times, values: observed },
    });
    const { frame, main, observed: seen, timeTicks, valueTicks } = model;
    axes(
      doc,
      frame,
      timeAxis(timeTicks),
      numberAxis(valueTicks, `${quantity} (${UNITS[system][kind].symbol})`),
    );
    strokePath(doc, main.path, COMPUTED);
    crosses(doc, seen!);
    legend(doc, frame.right, 6, [{ word: 'computed', sample: penSample(COMPUTED) }, crossEntry]);
  },
});
