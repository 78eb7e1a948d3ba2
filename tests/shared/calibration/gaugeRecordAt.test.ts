import { gaugeRecordAt } from '@/shared/calibration/gaugeRecordAt';
import type { GaugeFit, RunResiduals } from '@/shared/calibration/types';

const fit = (of: Partial<GaugeFit>): GaugeFit => ({
  gaugeId: 1,
  name: 'Ebbick',
  chainage: 17_400,
  quantity: 'stage',
  why: null,
  figures: null,
  series: { times: [0, 60], observed: [2, 3], computed: [2.1, 3.2] },
  ...of,
});
const residuals = { gauges: [fit({}), fit({ quantity: 'flow', why: 'noClock', series: null })] };

test('the record of the gauge that stands there, and no other', () => {
  const of = residuals as RunResiduals;
  expect(gaugeRecordAt(of, 17_400.5, 'stage')).toEqual({ times: [0, 60], values: [2, 3] });
  expect(gaugeRecordAt(of, 17_350, 'stage')).toBeNull();
  expect(gaugeRecordAt(of, 17_400, 'flow')).toBeNull();
  expect(gaugeRecordAt(null, 17_400, 'stage')).toBeNull();
});
