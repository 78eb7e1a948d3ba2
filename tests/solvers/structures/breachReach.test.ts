import type { CaseFile } from '@/shared/case/caseFile';
import type { BreachInput, ReservoirInput } from '@/shared/case/structures';
import { steadyFlow } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel, last } from './structureCases';

/** The dam over a reach that lies far below it, so that no tailwater reaches the breach. */
const dam: BreachInput = {
  kind: 'breach',
  id: 'dam',
  chainage: 0,
  crest: [
    [0, 30],
    [200, 30],
  ],
  trigger: { kind: 'time', time: 0 },
  mode: 'overtopping',
  growth: 'linear',
  formationTime: 0,
  bottomWidth: 50,
  bottomLevel: 20,
  startLevel: 20,
  sideSlope: 0,
  weirCoefficient: 1.7,
};
const pool: ReservoirInput = {
  stages: [20, 40],
  volumes: [0, 2e7],
  initialStage: 30,
  inflow: { times: [0], flows: [0] },
};

function damCase(breach: BreachInput, parts: Partial<CaseFile> = {}, wide = 200): CaseFile {
  return channel(
    [breach],
    {
      upstream: { kind: 'reservoir', ...pool },
      downstream: { kind: 'criticalDepth' },
      initial: { kind: 'still', stage: -50 },
      numerics: { cellSize: 50, duration: 14400, outputInterval: 300 },
      ...parts,
    },
    { width: wide, fall: 10, length: 2000, bed: -10 },
  );
}

/** Level pool of 1 km² with 10 m over the sill, Q = 1.7 b h^1.5: exact solutions of dh/dt = -Q/A. */
describe('a breach in the dam of a level pool', () => {
  it('at once: h = (h0^-0.5 + C b t/(2A))^-2', () => {
    const result = routeChecked(damCase(dam));
    const { stage, release, balance } = result.reservoir!;
    for (const [time, head, flow] of [
      [0, 10, 2687.936],
      [600, 8.563267, 2129.9927],
      [1800, 6.483609, 1403.2793],
      [3600, 4.541848, 822.7499],
      [7200, 2.582862, 352.8343],
      [14400, 1.160622, 106.2809],
    ]) {
      const k = result.times.indexOf(time);
      expect(Math.abs((stage[k] - 20) / head - 1)).toBeLessThan(1e-3);
      expect(Math.abs(release[k] / flow - 1)).toBeLessThan(1e-3);
    }
    expect(Math.abs(balance.relativeError)).toBeLessThan(1e-12);
    expect(Math.abs(balance.release / result.volume.inflow - 1)).toBeLessThan(1e-12);
    expect(Math.abs(balance.release / 8839377.8 - 1)).toBeLessThan(1e-3);
  });

  it('its width growing in half an hour: h = (h0^-0.5 + C b t²/(4 A t_f))^-2, and the peak at its end', () => {
    const result = routeChecked(damCase({ ...dam, formationTime: 1800 }));
    const { stage } = result.reservoir!;
    const [{ flow, breach, peak }] = result.structures!;
    for (const [time, width, head, q] of [
      [300, 8.3333, 9.933139, 443.5039],
      [600, 16.6667, 9.73653, 860.8034],
      [900, 25, 9.421581, 1229.0643],
      [1200, 33.3333, 9.005703, 1531.4546],
      [1500, 41.6667, 8.510264, 1758.5399],
      [1800, 50, 7.958331, 1908.3232],
      [2700, 50, 6.483609, 1403.2793],
      [3600, 50, 5.383817, 1061.8284],
      [7200, 50, 2.932293, 426.8055],
    ]) {
      const k = result.times.indexOf(time);
      expect(breach!.width[k]).toBeCloseTo(width, 3);
      expect(Math.abs((stage[k] - 20) / head - 1)).toBeLessThan(1e-3);
      expect(Math.abs(flow[k] / q - 1)).toBeLessThan(1e-3);
    }
    expect(Math.abs(peak.flow / 1908.3232 - 1)).toBeLessThan(1e-3);
    expect(peak.flowTime).toBeCloseTo(1800, -1);
  });

  it('waits for the stage that triggers it, the inflow filling the pool and the spillway running', () => {
    const upstream: CaseFile['upstream'] = {
      kind: 'reservoir',
      ...pool,
      inflow: steadyFlow(500),
      spillway: { stages: [30, 31], flows: [0, 100] },
    };
    const late = { ...dam, trigger: { kind: 'stage', stage: 30.2 } as const, formationTime: 600 };
    const result = routeChecked(
      damCase(
        {
          ...late,
          crest: [
            [0, 32],
            [200, 32],
          ],
        },
        { upstream },
      ),
    );
    const [breach, spillway] = result.structures!;
    const begun = breach.flow.findIndex((q) => q > 0);
    // 0.2 m of 1 km² fill in a little over 400 s at 500 m³/s, less what the spillway takes.
    expect(result.times[begun]).toBe(600);
    expect(spillway.id).toBe('spillway');
    expect(spillway.peak.flow).toBeGreaterThan(15);
    expect(breach.peak.flow).toBeGreaterThan(1500);
    expect(Math.abs(result.reservoir!.balance.relativeError)).toBeLessThan(1e-12);
  });

  it('is held back by tailwater that rises in a narrow valley', () => {
    const low = { ...dam, bottomLevel: 0, startLevel: 0, bottomWidth: 30, weirCoefficient: 1.7 };
    const upstream: CaseFile['upstream'] = {
      kind: 'reservoir',
      ...pool,
      stages: [0, 40],
      volumes: [0, 4e7],
    };
    const narrow = routeChecked(
      damCase(low, { upstream, downstream: { kind: 'normalDepth', slope: 0.0005 } }, 30),
    );
    const { regime, stageUp, stageDown } = narrow.structures![0];
    expect(regime).toContain('drowned');
    stageUp.forEach((eta, k) => expect(eta).toBeGreaterThanOrEqual(stageDown[k]));
    const k = regime.indexOf('drowned');
    const tail = stageDown[k] / stageUp[k];
    const free = 1.7 * 30 * stageUp[k] ** 1.5;
    // Villemonte (1947), Engineering News-Record, 25 December 1947, p. 866.
    const expected = free * (1 - tail ** 1.5) ** 0.385;
    expect(narrow.structures![0].flow[k] / expected).toBeCloseTo(1, 6);
    expect(narrow.structures![0].flow[k]).toBeLessThan(0.9 * free);
  });

  it('begins as a pipe and ends as an open breach, without a jump of its flow', () => {
    const piping: BreachInput = {
      ...dam,
      mode: 'piping',
      startLevel: 24,
      formationTime: 3600,
      growth: 'sine',
      sideSlope: 0,
    };
    const result = routeChecked(
      damCase(piping, { numerics: { cellSize: 50, duration: 7200, outputInterval: 30 } }),
    );
    const { flow, regime } = result.structures![0];
    expect(regime).toContain('pipe');
    expect(last(regime)).toBe('free');
    expect(regime.indexOf('free', regime.indexOf('pipe'))).toBeGreaterThan(regime.indexOf('pipe'));
    const most = Math.max(...flow);
    for (let k = 1; k < flow.length; k++)
      expect(Math.abs(flow[k] - flow[k - 1])).toBeLessThan(0.1 * most);
  });
});

describe('a dam whose reservoir is the reach above it', () => {
  const within: BreachInput = {
    ...dam,
    chainage: 1000,
    crest: [
      [0, 14],
      [60, 14],
    ],
    bottomWidth: 30,
    bottomLevel: 5,
    startLevel: undefined,
    sideSlope: 0.5,
    formationTime: 600,
    trigger: { kind: 'time', time: 300 },
  };
  delete within.startLevel;
  const reach = (breach: BreachInput, parts: Partial<CaseFile> = {}) =>
    channel(
      [breach],
      {
        downstream: { kind: 'normalDepth', slope: 0.005 },
        initial: { kind: 'dam', chainage: 1000, stageAbove: 13, stageBelow: null },
        numerics: { cellSize: 20, duration: 3600, outputInterval: 60 },
        ...parts,
      },
      { width: 60, fall: 10, length: 2000 },
    );

  it('stands still until its trigger, then lets its water go', () => {
    const result = routeChecked(reach(within));
    const [{ flow, breach, peak }] = result.structures!;
    expect(flow.slice(0, 6).every((q) => q === 0)).toBe(true);
    expect(peak.flow).toBeGreaterThan(300);
    expect(last(breach!.bottom)).toBe(5);
    expect(last(breach!.width)).toBe(30);
    expect(result.cells.arrival[result.cells.arrival.length - 1]).toBeGreaterThan(300);
  });

  it('fails from overtopping at the stage that its inflow brings', () => {
    const result = routeChecked(
      reach(
        { ...within, trigger: { kind: 'stage', stage: 14.2 } },
        {
          upstream: { kind: 'inflow', ...steadyFlow(150) },
          initial: { kind: 'dam', chainage: 1000, stageAbove: 13.5, stageBelow: null },
        },
      ),
    );
    const [{ stageUp, breach, regime }] = result.structures!;
    const begun = breach!.width.findIndex((width) => width > 0);
    expect(begun).toBeGreaterThan(0);
    expect(regime[begun - 1]).toBe('free');
    expect(stageUp[begun - 1]).toBeLessThan(14.25);
  });

  it('leaves what has nothing to do with it the same to the bit', () => {
    // Dry ground far below a flood that never gets there.
    const parts: Partial<CaseFile> = {
      upstream: { kind: 'inflow', times: [0, 300], flows: [5, 60] },
      initial: { kind: 'still', stage: -5 },
      numerics: { cellSize: 20, duration: 240, outputInterval: 60 },
    };
    const far = { ...within, chainage: 1900 };
    const withDam = routeChecked(reach(far, parts));
    const without = routeChecked({ ...reach(far, parts), structures: [] });
    expect(withDam.sections).toEqual(without.sections);
    expect(withDam.cells).toEqual(without.cells);
    expect(withDam.steps).toBe(without.steps);
    expect(withDam.volume).toEqual(without.volume);
  });
});
