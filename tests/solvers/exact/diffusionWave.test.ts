import { diffusionWave, erfc } from '@/server/solvers/exact/diffusionWave';

/** c = 2 m/s, D = 5000 m²/s; values computed from the formulas apart from this program, in double precision. */
const wave = diffusionWave(2, 5000);

describe('the linear diffusion wave', () => {
  it.each([
    [10_000, 1800, 0.10251433],
    [10_000, 3600, 0.43361112],
    [10_000, 5000, 0.62769784],
    [10_000, 7200, 0.80805862],
    [10_000, 10_800, 0.93226524],
    [10_000, 15_000, 0.97854357],
    [10_000, 30_000, 0.99950395],
    [30_000, 3600, 0.0001183],
    [30_000, 7200, 0.04659835],
    [30_000, 10_800, 0.26530773],
    [30_000, 15_000, 0.57839548],
    [30_000, 30_000, 0.97492442],
  ])('a step seen at %d m after %d s', (x, time, share) => {
    expect(wave.step(x, time)).toBeCloseTo(share, 8);
  });

  it.each([
    [12, 0.56289897, 2.114931],
    [24, 0.85310324, 2.031775],
    [120, 0.993422, 2.00132],
  ])(
    'an inflow with a period of %d h: what is left after 50 km, and its celerity',
    (hours, left, speed) => {
      const { decay, waveNumber } = wave.sinusoid(hours * 3600);
      expect(Math.exp(-decay * 50_000)).toBeCloseTo(left, 7);
      expect((2 * Math.PI) / (hours * 3600) / waveNumber).toBeCloseTo(speed, 6);
    },
  );

  it('begins with the step itself and keeps the equation', () => {
    expect(wave.step(0, 100)).toBeCloseTo(1, 14);
    expect([wave.step(10, 0), wave.step(1e5, 10)]).toEqual([0, 0]);
    const [x, t, dx, dt] = [9000, 4000, 50, 20];
    const rate = (wave.step(x, t + dt) - wave.step(x, t - dt)) / (2 * dt);
    const slope = (wave.step(x + dx, t) - wave.step(x - dx, t)) / (2 * dx);
    const bend = (wave.step(x + dx, t) - 2 * wave.step(x, t) + wave.step(x - dx, t)) / (dx * dx);
    // Each term is some 1e-4 1/s.
    expect(Math.abs(rate + 2 * slope - 5000 * bend)).toBeLessThan(1e-8);
  });
});

describe('the complementary error function', () => {
  // M. Abramowitz and I. A. Stegun (1964), table 7.1: erf 0.5 = 0.5204998778, erf 1 = 0.8427007929, erf 2 = 0.9953222650.
  it.each([
    [0, 1],
    [0.5, 1 - 0.5204998778],
    [1, 1 - 0.8427007929],
    [2, 1 - 0.995322265],
    [-1, 1.8427007929],
  ])('of %f', (x, value) => expect(erfc(x)).toBeCloseTo(value, 9));

  it('is the same from both formulas where they meet', () => {
    expect(erfc(2 - 1e-12) / erfc(2)).toBeCloseTo(1, 10);
  });
});
