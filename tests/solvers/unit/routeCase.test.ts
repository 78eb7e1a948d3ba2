import { routeCase, RunCancelled, SOLVER_VERSION, caseHash } from '../../../server/solvers';
import { ARRIVAL_RISE } from '../../../shared/case/resultFile';
import { soundCase } from './soundCase';

describe('routing a case', () => {
  const result = routeCase(soundCase());

  it('says what it is the result of', () => {
    expect(result.format).toBe('spate-result/1');
    expect(result.caseHash).toBe(caseHash(soundCase()));
    expect(result.solver).toBe(SOLVER_VERSION);
  });

  it('has a value of every section at every output time', () => {
    expect(result.times).toEqual([0, 300, 600, 900, 1200, 1500, 1800]);
    expect(result.sections.map(({ id }) => id)).toEqual(['S1', 'S2', 'S3']);
    for (const section of result.sections) {
      for (const key of ['stage', 'depth', 'flow', 'area', 'velocity', 'froude'] as const) {
        expect(section[key]).toHaveLength(7);
        expect(section[key].every(Number.isFinite)).toBe(true);
      }
      section.stage.forEach((stage, k) =>
        expect(section.depth[k]).toBeCloseTo(stage - section.bed, 12),
      );
      expect(section.peak.stage).toBeGreaterThanOrEqual(Math.max(...section.stage));
      expect(section.peak.flow).toBeGreaterThanOrEqual(Math.max(...section.flow));
    }
    for (const [key, values] of Object.entries(result.cells)) {
      expect([key, values.length]).toEqual([key, 20]);
    }
  });

  it('takes the inflow in at the first section and lets the wave go down', () => {
    const [first, middle, last] = result.sections;
    expect(first.flow[0]).toBeCloseTo(5, 6);
    expect(first.flow[2]).toBeCloseTo(20, 9);
    expect(last.flow[1]).toBeLessThan(first.flow[1]);
    // The tail of the wave is still coming in.
    expect(last.flow[6]).toBeGreaterThan(19.5);
    expect(last.flow[6]).toBeLessThan(20);
    const arrivals = [first.arrival, middle.arrival, last.arrival].map(Number);
    expect(arrivals[0]).toBeGreaterThan(0);
    expect(arrivals[1]).toBeGreaterThan(arrivals[0]);
    expect(arrivals[2]).toBeGreaterThan(arrivals[1]);
    expect(result.arrivalThreshold.rise).toBe(ARRIVAL_RISE);
  });

  it('keeps the volume', () => {
    const { initial, inflow, lateral, outflow, final, relativeError } = result.volume;
    // 5 rising to 20 m³/s in 600 s, then 20 for 1200 s.
    expect(inflow).toBeCloseTo(12.5 * 600 + 20 * 1200, 6);
    expect(initial + inflow + lateral - outflow).toBeCloseTo(final, 6);
    expect(Math.abs(relativeError)).toBeLessThan(1e-12);
  });

  it('is the same to the bit, watched or not', () => {
    const progress: number[] = [];
    const outputs: number[] = [];
    const watched = routeCase(soundCase(), {
      onProgress: ({ fraction }) => progress.push(fraction),
      onOutput: ({ index, stage, flow, velocity }) => {
        outputs.push(index);
        expect([stage.length, flow.length, velocity.length]).toEqual([20, 20, 20]);
      },
      shouldStop: () => false,
    });
    expect({ ...watched, seconds: 0 }).toEqual({ ...result, seconds: 0 });
    expect(outputs).toEqual([0, 1, 2, 3, 4, 5, 6]);
    expect(progress[progress.length - 1]).toBe(1);
  });

  it('stops when asked', () => {
    const polls: boolean[] = [];
    const stop = (): boolean => polls.push(true) > 0;
    expect(() => routeCase(soundCase(), { shouldStop: stop })).toThrow(RunCancelled);
    expect(polls).toHaveLength(1);
  });

  it('takes no more from the side than there is, and says so', () => {
    const thirsty = soundCase();
    thirsty.laterals = [{ from: 400, to: 500, times: [0, 300], flows: [0, -50] }];
    const { volume, warnings, cells } = routeCase(thirsty);
    expect(volume.lateral).toBeLessThan(-5 * 1000);
    expect(volume.lateral).toBeGreaterThan(-50 * 1800);
    expect(Math.abs(volume.relativeError)).toBeLessThan(1e-12);
    expect(Math.min(...cells.finalDepth)).toBeGreaterThanOrEqual(0);
    expect(warnings.map(({ code }) => code)).toContain('lateralLimited');
  });

  it('warns of water above the survey, where and by how much', () => {
    const wet = soundCase();
    wet.upstream = { kind: 'inflow', times: [0, 600], flows: [5, 900] };
    const { warnings, sections } = routeCase(wet);
    const warning = warnings.find(({ code }) => code === 'aboveSurvey');
    const excess = Math.max(...sections.map(({ peak }, k) => peak.stage - (14 - k)));
    expect(excess).toBeGreaterThan(0);
    expect(warning?.message).toContain(`by ${excess.toFixed(2)} m`);
  });

  it('leaves a dry place dry: stage at the bed, all else 0, no arrival', () => {
    const dry = soundCase();
    dry.upstream = { kind: 'wall' };
    dry.initial = { kind: 'still', stage: 9 };
    const { sections } = routeCase(dry);
    const [first] = sections;
    expect(first.stage).toEqual(first.stage.map(() => first.bed));
    for (const key of ['depth', 'flow', 'area', 'velocity', 'froude'] as const) {
      expect(first[key]).toEqual(first[key].map(() => 0));
    }
    expect(first.arrival).toBeNull();
    expect(first.peak.depth).toBe(0);
  });

  it('runs at first order, on one cell and on two', () => {
    for (const cellSize of [1000, 500]) {
      for (const order of [1, 2] as const) {
        const short = soundCase();
        short.numerics = { ...short.numerics, cellSize, order };
        const { volume, sections } = routeCase(short);
        expect(Math.abs(volume.relativeError)).toBeLessThan(1e-12);
        expect(sections[2].flow[6]).toBeGreaterThan(10);
      }
    }
  });
});
