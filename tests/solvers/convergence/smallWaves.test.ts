import { diffusionWave } from '@/server/solvers/exact/diffusionWave';
import { linearWave } from '@/server/solvers/exact/linearWave';
import { trapezoid, wideRectangle } from '@/server/solvers/exact/prismaticSection';
import type { FlowSeries, SectionPoint } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSection,
  GRAVITY,
  openRectanglePoints,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Changes of the inflow by a hundredth run down a long even channel as linear theory says: slow ones as diffusion waves,
 *  with the celerity dQ/dA and the diffusivity Q/(2 B S0) [1 - (c/V - 1)² Fr²], all of them by the full linear equations.
 *  Friction, slope, thrust and inertia each have their part in these numbers. */
interface Channel {
  manning: number;
  slope: number;
  flow: number;
  /** Of a section with its bed at the given elevation. */
  points: (bed: number) => SectionPoint[];
}

const MILD: Channel = {
  manning: 0.03,
  slope: 0.001,
  flow: 2,
  points: (bed) => openRectanglePoints(1, bed),
};
const mild = linearWave(wideRectangle(1), GRAVITY, 0.03, 0.001, 2);
const CHANGE = 0.01;

/** Flows at the gauges (m from the inlet), as shares of the change. */
function route(
  channel: Channel,
  change: (time: number) => number,
  gauges: number[],
  duration: number,
  cellSize: number,
  length: number,
) {
  const every = duration / 720;
  const times = Array.from({ length: 721 }, (_, i) => i * every);
  const inflow: FlowSeries = {
    times,
    flows: times.map((time) => channel.flow * (1 + CHANGE * change(time))),
  };
  const result = routeChecked(
    buildCase({
      sections: [0, ...gauges, length].map((x) =>
        buildSection(x, channel.points(channel.slope * (length - x)), channel.manning),
      ),
      upstream: { kind: 'inflow', ...inflow },
      downstream: { kind: 'normalDepth', slope: channel.slope },
      initial: { kind: 'steady' },
      numerics: { cellSize, duration, outputInterval: every },
    }),
  );
  return {
    times: result.times,
    shares: gauges.map((_, i) =>
      result.sections[i + 1].flow.map((flow) => (flow / channel.flow - 1) / CHANGE),
    ),
  };
}

/** Amplitude and phase of the last of `periods` equal periods of a series. */
function harmonic(values: readonly number[], periods: number) {
  const count = (values.length - 1) / periods;
  let [cosine, sine] = [0, 0];
  for (let k = 0; k < count; k++) {
    const value = values[values.length - count + k];
    const angle = (2 * Math.PI * (values.length - count + k)) / count;
    cosine += value * Math.cos(angle);
    sine += value * Math.sin(angle);
  }
  return { amplitude: (2 * Math.hypot(cosine, sine)) / count, phase: Math.atan2(-cosine, sine) };
}

describe('a small sinusoidal change of the inflow', () => {
  it.each([
    // Period (s), gauges (m), cells (m), periods until all is even.
    [1200, 1000, 2500, 25, 6],
    [3600, 2000, 7000, 50, 4],
    [14_400, 4000, 20_000, 200, 3],
  ])('of %d s decays and lags as in the linear equations', (period, from, to, cell, periods) => {
    const { shares } = route(
      MILD,
      (time) => Math.sin((2 * Math.PI * time) / period),
      [from, to],
      periods * period,
      cell,
      2 * to,
    );
    const [near, far] = shares.map((series) => harmonic(series, periods));
    const { decay, waveNumber } = mild.sinusoid(period);
    const distance = to - from;
    const found = Math.log(near.amplitude / far.amplitude) / distance;
    const turns = Math.round((waveNumber * distance - (far.phase - near.phase)) / (2 * Math.PI));
    const lag = (far.phase - near.phase + 2 * Math.PI * turns) / distance;
    // The change is a hundredth, so the full equations differ from the linear ones by some 1e-4; cells add the rest.
    expect(Math.abs(found / decay - 1)).toBeLessThan(0.007);
    expect(Math.abs(lag / waveNumber - 1)).toBeLessThan(7e-4);
  });
});

describe('a small step of the inflow', () => {
  it('comes as the diffusion wave of Hayami', () => {
    const gauges = [10_000, 20_000];
    const { times, shares } = route(
      MILD,
      (time) => (time > 0 ? 1 : 0),
      gauges,
      21_600,
      100,
      40_000,
    );
    const wave = diffusionWave(mild.kinematicCelerity, mild.diffusivity);
    gauges.forEach((x, i) => {
      const errors = times.map((time, k) => Math.abs(shares[i][k] - wave.step(x, time)));
      // The diffusion wave leaves out the third moment of the true response, which fades as 1/√x.
      expect(Math.max(...errors)).toBeLessThan([0.015, 0.008][i]);
    });
  });
});

/** Mean (s) and variance (s²) of the time at which a pulse passes. */
function moments(times: readonly number[], shares: readonly number[]) {
  const sum = (f: (time: number) => number) =>
    times.reduce((total, time, i) => total + f(time) * shares[i], 0);
  const mean = sum((time) => time) / sum(() => 1);
  return { mean, variance: sum((time) => (time - mean) ** 2) / sum(() => 1) };
}

describe('a small pulse of the inflow', () => {
  const STEEP: Channel = { ...MILD, slope: 0.004, manning: 0.05 };
  const TRIANGLE: Channel = {
    manning: 0.03,
    slope: 0.002,
    flow: 5,
    points: (bed) => trapezoidPoints(0, 3, bed, 4),
  };
  it.each([
    ['a wide rectangle', MILD, wideRectangle(1), 5 / 3],
    ['a steep wide rectangle', STEEP, wideRectangle(1), 5 / 3],
    ['a triangle', TRIANGLE, trapezoid(0, 3), 4 / 3],
  ])('in %s travels at dQ/dA and spreads by 2 D/c³', (_name, channel, section, ratio) => {
    const wave = linearWave(section, GRAVITY, channel.manning, channel.slope, channel.flow);
    const width = 900;
    const gauges = [3000, 11_000];
    const { times, shares } = route(
      channel,
      (time) => Math.exp(-(((time - 6 * width) / width) ** 2) / 2),
      gauges,
      9 * width + 2.5 * (11_000 / wave.kinematicCelerity),
      50,
      16_000,
    );
    const [near, far] = shares.map((series) => moments(times, series));
    const distance = gauges[1] - gauges[0];
    const celerity = distance / (far.mean - near.mean);
    expect(wave.kinematicCelerity / wave.velocity).toBeCloseTo(ratio, 4);
    const spread = (2 * wave.diffusivity * distance) / wave.kinematicCelerity ** 3;
    expect(Math.abs(celerity / wave.kinematicCelerity - 1)).toBeLessThan(0.003);
    expect(Math.abs((far.variance - near.variance) / spread - 1)).toBeLessThan(0.015);
    // The peak of a Gaussian pulse falls as 1/√(1 + 2 D x/(c³ σ²)).
    const peaks = Math.max(...shares[1]) / Math.max(...shares[0]);
    expect(peaks * Math.sqrt(1 + spread / near.variance)).toBeCloseTo(1, 2);
  });
});
