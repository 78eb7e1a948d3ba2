import type { GaugeBody, MarkBody } from '../shared/calibration/schemas';
import type { MarkConfidence, MarkKind } from '../shared/calibration/types';

/** An earlier flood of the Lower Veshall, almost the size of the design flood. */
export const OBSERVED_FLOOD = 'January 2019';

/**
 * Invented: the levels of the design flood on a river that is rougher than the survey says (channel 1.12, flood plain 1.3
 * times), scattered as marks are. A search finds about these multipliers again.
 */
const MARKS: [chainage: number, level: number, MarkKind, MarkConfidence, note: string][] = [
  [900, 52.15, 'debris', 'good', 'Fence at the upper ford, left bank'],
  [2650, 50.27, 'debris', 'good', ''],
  [4300, 48.34, 'stain', 'good', 'Wall of the pump house'],
  [6150, 46.86, 'debris', 'fair', 'Reeds laid flat'],
  [7900, 44.71, 'debris', 'good', ''],
  [9400, 43.76, 'eyewitness', 'poor', 'Told by the tenant, at night'],
  [10_550, 42.07, 'stain', 'good', 'Abutment of Tornick bridge, upstream'],
  [11_200, 41.08, 'stain', 'good', 'School, inner wall'],
  [12_900, 38.96, 'debris', 'fair', ''],
  [13_150, 38.66, 'stain', 'good', 'Sallow Mill, gauge board by the wheel'],
  [14_800, 37.15, 'debris', 'fair', ''],
  [16_200, 35.02, 'eyewitness', 'poor', 'From a photograph without a time'],
  [17_350, 35.08, 'gaugePeak', 'good', 'Crest gauge at Ebbick'],
  [18_900, 33.96, 'debris', 'good', ''],
  [20_600, 32.68, 'debris', 'fair', 'Hedge, right bank'],
];

export const OBSERVED_MARKS: MarkBody[] = MARKS.map(
  ([chainage, level, kind, confidence, note]) => ({
    chainage,
    level,
    kind,
    confidence,
    flood: OBSERVED_FLOOD,
    observedOn: '2019-01-12',
    note,
  }),
);

/** Stage at Ebbick, hour by hour from the start of the flood, m. */
const EBBICK = [
  31.64, 31.7, 31.66, 31.67, 31.67, 31.71, 31.9, 32.35, 32.91, 33.28, 33.45, 33.6, 33.78, 34.02,
  34.31, 34.58, 34.69, 34.89, 35.01, 35.04, 35.05, 34.97, 34.92, 34.81, 34.7, 34.6, 34.39, 34.22,
  34.03, 33.79, 33.21, 32.82, 32.67, 32.51, 32.39, 32.25, 32.18, 32.12, 32.04, 31.95, 31.9, 31.9,
  31.82, 31.81, 31.77, 31.72, 31.74,
];

export const OBSERVED_GAUGE: GaugeBody = {
  name: 'Gauge at Ebbick',
  chainage: 17_400,
  flood: OBSERVED_FLOOD,
  startsAt: null,
  stage: { times: EBBICK.map((_, hour) => hour * 3600), values: EBBICK },
  flow: null,
};
