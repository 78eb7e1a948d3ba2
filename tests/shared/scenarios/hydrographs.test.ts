import {
  generateHydrograph,
  inflowOf,
  peakOf,
  volumeOf,
  type GeneratedInflow,
} from '../../../shared/scenarios/hydrographs';
import { NRCS_ORDINATES } from '../../../shared/scenarios/nrcsHydrograph';

const inflow = (given: Partial<GeneratedInflow>): GeneratedInflow => ({
  kind: 'generated',
  shape: 'nrcs',
  baseFlow: 0,
  peakFlow: 100,
  timeToPeak: 3600,
  recessionRatio: null,
  gammaExponent: null,
  ...given,
});

describe('the NRCS dimensionless unit hydrograph', () => {
  // National Engineering Handbook, Part 630, chapter 16, table 16-1 (March 2007): ordinates as read at
  // bae.ncsu.edu/swce6/Dimensionless_Hydrograph.htm; mass ratios of the same table from memory.
  const MASS: [number, number][] = [
    [0.5, 0.065],
    [1, 0.375],
    [1.5, 0.705],
    [2, 0.871],
    [3, 0.977],
    [5, 1],
  ];

  test('has the published ordinates', () => {
    const at = new Map(NRCS_ORDINATES);
    expect(NRCS_ORDINATES).toHaveLength(33);
    expect([0.5, 1, 1.5, 2, 2.6, 4.5].map((t) => at.get(t))).toEqual([
      0.47, 1, 0.68, 0.28, 0.107, 0.005,
    ]);
  });
  test('accumulates to the published mass ratios, and 3/8 before its peak', () => {
    const total = volumeOf({
      times: NRCS_ORDINATES.map(([t]) => t),
      flows: NRCS_ORDINATES.map(([, q]) => q),
    });
    for (const [until, ratio] of MASS) {
      const part = NRCS_ORDINATES.filter(([t]) => t <= until);
      const share =
        volumeOf({ times: part.map(([t]) => t), flows: part.map(([, q]) => q) }) / total;
      // The table gives three decimals; straight lines between its ordinates add up to within 0.002 of it.
      expect(Math.abs(share - ratio)).toBeLessThan(0.002);
    }
  });
  test('has the peak rate factor of 484', () => {
    // q_p (cfs) = 484 A (mi²) Q (in) / T_p (h): 645.33 cfs·h is one inch over a square mile.
    const volume = volumeOf(generateHydrograph(inflow({}))!);
    expect((645.33 * 100 * 3600) / volume).toBeCloseTo(483.05, 1);
  });
  test('scales to peak, time to peak and base flow', () => {
    const series = generateHydrograph(inflow({ baseFlow: 20, timeToPeak: 7200 }))!;
    expect(peakOf(series)).toEqual({ flow: 100, time: 7200 });
    expect(series.flows[0]).toBe(20);
    expect(series.flows.at(-1)).toBe(20);
    expect(series.times.at(-1)).toBe(5 * 7200);
  });
});

test('the triangle has the volume of a triangle over its base flow', () => {
  const series = generateHydrograph(
    inflow({ shape: 'triangle', recessionRatio: 1.67, baseFlow: 10 }),
  )!;
  expect(series.times).toEqual([0, 3600, 3600 * 2.67]);
  expect(volumeOf(series)).toBeCloseTo(10 * 3600 * 2.67 + (90 * 3600 * 2.67) / 2, 6);
});

describe('the gamma shape', () => {
  // Closed form: ∫ τ^m e^(m(1−τ)) dτ = e^m m! / m^(m+1) for whole m.
  test.each([
    [1, 1, Math.E],
    [3, 6, Math.exp(3)],
    [5, 120, Math.exp(5)],
  ])('m = %i has its volume to within the cut of its tail', (m, factorial, exp) => {
    const volume = volumeOf(generateHydrograph(inflow({ shape: 'gamma', gammaExponent: m }))!);
    const exact = (100 * 3600 * exp * factorial) / m ** (m + 1);
    expect(Math.abs(volume / exact - 1)).toBeLessThan(2e-3);
  });
  test('stands highest at its time to peak, exactly', () => {
    expect(peakOf(generateHydrograph(inflow({ shape: 'gamma', gammaExponent: 3.7 })))).toEqual({
      flow: 100,
      time: 3600,
    });
  });
});

test('nothing is made of numbers that are missing or cannot be', () => {
  expect(generateHydrograph(inflow({ peakFlow: null }))).toBeNull();
  expect(generateHydrograph(inflow({ baseFlow: 200 }))).toBeNull();
  expect(generateHydrograph(inflow({ timeToPeak: 0 }))).toBeNull();
  expect(generateHydrograph(inflow({ shape: 'triangle', recessionRatio: -1 }))).toBeNull();
  expect(inflowOf({ kind: 'wall' })).toBeNull();
  expect(peakOf(inflowOf({ kind: 'table', times: [], flows: [] }))).toBeNull();
});
