import type { SectionInput, StoragePart } from '@/shared/case/caseFile';
import { ruledSurface, sectionAt } from '@/server/solvers/geometry/ruledSurface';
import { partedSweep } from '@/server/solvers/geometry/partedSweep';
import {
  buildCase,
  buildSections,
  GRAVITY,
  steadyFlow,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { staggeredFlood } from '../../helpers/solvers/staggeredFlood';

/** A walled channel 20 m wide with walled flat ground 40 m wide at the same level beside it. */
function channel(length: number, slope: number, storage?: StoragePart[], n = 0.03): SectionInput[] {
  return buildSections(0, length, 2, n, (x) =>
    trapezoidPoints(60, 0, slope * (length - x), 12),
  ).map((section) => ({ ...section, ...(storage && { storage }) }));
}
const HELD: StoragePart[] = [{ from: 20, to: 60 }];

describe('parts that store and do not flow', () => {
  it('slow a long wave to sqrt(g A_f/B)', () => {
    // A standing wave in a closed frictionless basin: η = a cos(πx/L) cos(πct/L), linear long-wave theory, with the
    // continuity of the whole width and the momentum of what flows: c = sqrt(9.81 · 20 · 3/60) = 3.132 m/s.
    const length = 1000;
    const depth = 3;
    const amplitude = 1e-3;
    const c = Math.sqrt((GRAVITY * 20 * depth) / 60);
    const period = (2 * length) / c;
    const middles = Array.from({ length: 100 }, (_, i) => 5 + 10 * i);
    const { sections, times } = routeChecked(
      buildCase({
        sections: channel(length, 0, HELD, 0),
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: {
          kind: 'profile',
          chainages: middles,
          stages: middles.map((x) => depth + amplitude * Math.cos((Math.PI * x) / length)),
          flows: middles.map(() => 0),
        },
        numerics: { cellSize: 10, duration: period, outputInterval: period / 40 },
      }),
    );
    // A wave of the whole section's celerity (5.42 m/s) would be off by the amplitude and more.
    times.forEach((time, k) => {
      const exact = amplitude * Math.cos((2 * Math.PI * time) / period);
      expect(Math.abs(sections[0].stage[k] - depth - exact)).toBeLessThan(0.03 * amplitude);
    });
  });

  it('leave steady flow as in the section without them', () => {
    const steady = (sections: SectionInput[]) =>
      routeChecked(
        buildCase({
          sections,
          upstream: { kind: 'inflow', ...steadyFlow(60) },
          downstream: { kind: 'normalDepth', slope: 0.001 },
          initial: { kind: 'steady' },
          numerics: { cellSize: 25, duration: 600, outputInterval: 600 },
        }),
      ).cells;
    const parted = steady(channel(2000, 0.001, HELD));
    // The same channel alone. Its far wall is wetted only where there is one: here it is made frictionless.
    const alone = steady(
      buildSections(0, 2000, 2, 0.03, (x) => [
        [0, 12 + 0.001 * (2000 - x)],
        [0, 0.001 * (2000 - x)],
        [20, 0.001 * (2000 - x)],
      ]),
    );
    expect(parted.peakVelocity[20]).toBeCloseTo(alone.peakVelocity[20], 3);
    parted.finalDepth.forEach((depth, i) => {
      // The levels of both tables stand at other heights.
      expect(Math.abs(depth - alone.finalDepth[i])).toBeLessThan(1e-3);
    });
  });

  it('dampen a flood as an independent staggered integration of the same equations does', () => {
    const length = 5000;
    const inflow = (t: number) => 60 * Math.sin((Math.PI * Math.min(t, 3600)) / 3600) ** 2;
    const times = Array.from({ length: 109 }, (_, k) => 50 * k);
    const { sections } = routeChecked(
      buildCase({
        sections: buildSections(0, length, 3, 0.03, (x) =>
          trapezoidPoints(60, 0, 0.0008 * (length - x), 12),
        ).map((section) => ({ ...section, storage: HELD })),
        upstream: { kind: 'inflow', times, flows: times.map(inflow) },
        downstream: { kind: 'wall' },
        initial: { kind: 'still', stage: 7 },
        numerics: { cellSize: 25, duration: 5400, outputInterval: 300 },
      }),
    );
    const reference = staggeredFlood({
      length,
      slope: 0.0008,
      flowWidth: 20,
      width: 60,
      walls: 1,
      manning: 0.03,
      stage: 7,
      inflow,
      duration: 5400,
      every: 300,
      at: 2500,
      gravity: GRAVITY,
    });
    const middle = sections[1].stage;
    reference.forEach((stage, k) => expect(Math.abs(middle[k] - stage)).toBeLessThan(5e-4));
    expect(Math.max(...middle) - middle[0]).toBeGreaterThan(0.3);
  });

  describe('that begin to flow above a level', () => {
    const at = (stage: number, isCompound = false) => {
      const [section] = channel(10, 0, [{ from: 20, to: 60, flowsAbove: 4 }]);
      const shape = sectionAt(ruledSurface(section, section), 0);
      const sweep = partedSweep(shape, Float64Array.of(stage), isCompound);
      return { area: sweep.area[0], flows: sweep.flowArea[0], beta: sweep.beta[0] };
    };

    it('do not below it, by halves on the way, and wholly 0.5 m above it', () => {
      expect(at(3.9)).toEqual({ area: 234, flows: 78, beta: 1 });
      const half = at(4.25);
      expect(half.area).toBeCloseTo(255, 12);
      expect(half.flows).toBeCloseTo(85 + 0.5 * 170, 12);
      // 1/A_f goes from 1/85 to 1/255 linearly on the way: β = A_f (1/85 + 1/255)/2.
      expect(half.beta).toBeCloseTo((170 * (1 / 85 + 1 / 255)) / 2, 12);
      expect(at(4.5)).toEqual({ area: 270, flows: 270, beta: 1 });
    });

    it('have the momentum of a section without parts then', () => {
      // The two pieces are of one zone each, without wetted perimeter between them.
      const [k1, k2] = [90 * (90 / 24.5) ** (2 / 3), 180 * (180 / 44.5) ** (2 / 3)];
      expect(at(4.5, true).beta).toBeCloseTo(
        (270 * (k1 ** 2 / 90 + k2 ** 2 / 180)) / (k1 + k2) ** 2,
        10,
      );
    });
  });

  it('on one of two neighbours flow with the weight of the other', () => {
    const [above, below] = channel(100, 0, HELD);
    const shape = sectionAt(ruledSurface(above, { ...below, storage: [] }), 0.25);
    const { area, flowArea } = partedSweep(shape, Float64Array.of(2), false);
    expect(area[0]).toBeCloseTo(120, 12);
    expect(flowArea[0]).toBeCloseTo(40 + 0.25 * 80, 12);
  });
});
