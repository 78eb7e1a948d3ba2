import { fitGauge } from '../../../shared/calibration/gaugeFit';
import { misfit } from '../../../shared/calibration/misfit';
import { efficiency, summarise } from '../../../shared/calibration/residuals';

// Every expected number here was worked out by hand from the formulas beside it; no published table of residuals was found.

test('mean error, root mean square and counts of residuals', () => {
  // e = 0.1, -0.3, 0.4, 0: mean 0.05; squares 0.01 + 0.09 + 0.16 = 0.26, over 4 = 0.065.
  const summary = summarise([0.1, -0.3, 0.4, 0], [0.3, 0.3, 0.3, 0.3])!;
  expect(summary.count).toBe(4);
  expect(summary.mean).toBeCloseTo(0.05, 12);
  expect(summary.rms).toBeCloseTo(Math.sqrt(0.065), 12);
  expect(summary.largest).toBe(0.4);
  expect(summary.within).toBe(3);
  expect(summarise([], [])).toBeNull();
});

test('a residual at its tolerance lies within it whatever binary fractions make of it', () => {
  expect(summarise([12.3 - 12.0], [0.3])!.within).toBe(1);
});

describe('efficiency of Nash and Sutcliffe (1970)', () => {
  const observed = [1, 2, 3, 4, 5]; // mean 3, Σ(o − ō)² = 10
  it('is 1 less the squares left over by the spread', () => {
    // Σ(o − c)² = 0.01 + 0.01 + 0.04 + 0.04 + 0.01 = 0.11
    expect(efficiency(observed, [1.1, 1.9, 3.2, 3.8, 5.1])).toBeCloseTo(1 - 0.11 / 10, 12);
  });
  it('is 1 for a perfect fit, 0 for the mean, below 0 for worse', () => {
    expect(efficiency(observed, observed)).toBe(1);
    expect(efficiency(observed, [3, 3, 3, 3, 3])).toBe(0);
    expect(efficiency(observed, [5, 4, 3, 2, 1])).toBeCloseTo(-3, 12); // 40 / 10
  });
  it('says nothing of a record that does not vary', () => {
    expect(efficiency([2, 2], [1, 3])).toBeNull();
  });
});

describe('a gauge against a run', () => {
  // Computed: a tent from 0 at 0 s to 10 at 100 s and back to 0 at 200 s.
  const computed = { times: [0, 50, 100, 150, 200], values: [0, 5, 10, 5, 0] };

  it('compares at the observed times, linear between the computed ones', () => {
    const observed = { times: [-50, 25, 75, 125, 175, 400], values: [9, 2.5, 8.5, 9.5, 2.5, 9] };
    const { figures, matched } = fitGauge(observed, computed)!;
    expect(matched.times).toEqual([25, 75, 125, 175]);
    expect(matched.computed).toEqual([2.5, 7.5, 7.5, 2.5]);
    // e = 0, -1, -2, 0
    expect(figures.mean).toBeCloseTo(-0.75, 12);
    expect(figures.rms).toBeCloseTo(Math.sqrt(5 / 4), 12);
    // ō = 5.75, spread 10.5625 + 7.5625 + 14.0625 + 10.5625 = 42.75
    expect(figures.efficiency).toBeCloseTo(1 - 5 / 42.75, 12);
    expect(figures.peak).toEqual({
      observed: { value: 9.5, time: 125 },
      computed: { value: 10, time: 100 },
      error: 0.5,
      delay: -25,
    });
  });

  it('tells no peak of a record that ends with its highest value', () => {
    const { figures } = fitGauge({ times: [0, 50, 90], values: [0, 4, 8] }, computed)!;
    expect(figures.peak).toBeNull();
    expect(figures.count).toBe(3);
  });

  it('is null where the times do not meet', () => {
    expect(fitGauge({ times: [300, 400], values: [1, 2] }, computed)).toBeNull();
  });
});

test('misfit: 1 where everything lies off by its tolerance', () => {
  const off = [
    { error: 0.3, tolerance: 0.3 },
    { error: -0.5, tolerance: 0.5 },
    { error: 0.15, tolerance: 0.15 },
  ];
  expect(misfit(off)).toBeCloseTo(1, 12);
  // 2² + 0² over 2
  expect(
    misfit([
      { error: 0.6, tolerance: 0.3 },
      { error: 0, tolerance: 1 },
    ]),
  ).toBeCloseTo(Math.SQRT2, 12);
  expect(misfit([])).toBeNull();
});
