import { hydrographModel, peakOf } from '@/components/charts/geometry/hydrographModel';

const times = Array.from({ length: 49 }, (_, i) => i * 3600);
const flow = {
  times,
  values: times.map((t) => 50 + 400 * Math.exp(-(((t - 60_000) / 30_000) ** 2))),
};
const size = { width: 352, height: 180 };

test('flow is drawn from zero, stage from about its lowest', () => {
  const flowModel = hydrographModel(size, flow, null, 'flow', 'metric');
  expect(flowModel.frame.y.domain()[0]).toBe(0);
  const stage = { times, values: flow.values.map((q) => 38 + q / 100) };
  const stageModel = hydrographModel(size, stage, null, 'elevation', 'metric');
  expect(stageModel.frame.y.domain()[0]).toBe(38);
});

test('the second curve fits too and is cut to the run', () => {
  const inflow = { times: [-3600, 0, 40_000, 999_999], values: [0, 50, 620, 50] };
  const model = hydrographModel(size, flow, inflow, 'flow', 'metric');
  expect(model.frame.y.domain()[1]).toBeGreaterThanOrEqual(620);
  expect(Array.from(model.compare!.x)).toHaveLength(2);
});

test('values are drawn in the units of the study', () => {
  const model = hydrographModel(size, flow, null, 'flow', 'usCustomary');
  // 450 m³/s are 15,892 ft³/s: 450 / 0.3048³ (international foot, NIST SP 811).
  expect(model.frame.y.domain()[1]).toBeGreaterThanOrEqual(450 / 0.3048 ** 3 - 100);
  expect(model.yOf(0)).toBe(model.frame.bottom);
});

test('the peak is the first of the highest', () => {
  expect(peakOf({ times: [0, 1, 2, 3], values: [1, 5, 5, 2] })).toEqual({ value: 5, time: 1 });
  expect(peakOf({ times: [], values: [] })).toBeNull();
});

test('what was observed fits into the drawing, and only what falls within its time is drawn', () => {
  const observed = { times: [-3600, 3600, 7200, 1e6], values: [0, 60, 70, 0] };
  const plain = hydrographModel(size, flow, null, 'flow', 'metric');
  const model = hydrographModel(size, flow, null, 'flow', 'metric', { observed });
  const last = flow.times[flow.times.length - 1];
  expect(last).toBeLessThan(1e6);
  expect(model.observed!.x).toHaveLength(2);
  expect(model.observed!.y[1]).toBeCloseTo(model.yOf(70), 9);
  const high = { times: [3600], values: [2 * plain.frame.y.domain()[1]] };
  const taller = hydrographModel(size, flow, null, 'flow', 'metric', { observed: high });
  expect(taller.frame.y.domain()[1]).toBeGreaterThanOrEqual(high.values[0]);
});
