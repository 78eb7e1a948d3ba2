import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { normalDepth } from '@/server/solvers/exact/uniformFlow';
import type { Downstream } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSection,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

interface Channel {
  bottom: number;
  side: number;
  manning: number;
  slope: number;
  flow: number;
}

/** Routes the steady flow of an even channel until it rests; depths at `upstream` metres from its lower end. */
function settle(channel: Channel, upstream: number[], downstream: Downstream, cellSize: number) {
  const length = Math.max(...upstream);
  const result = routeChecked(
    buildCase({
      sections: upstream
        .map((distance) =>
          buildSection(
            length - distance,
            trapezoidPoints(channel.bottom, channel.side, channel.slope * distance, 8),
            channel.manning,
          ),
        )
        .sort((a, b) => a.chainage - b.chainage),
      upstream: { kind: 'inflow', ...steadyFlow(channel.flow) },
      downstream,
      initial: { kind: 'steady' },
      numerics: { cellSize, duration: 2400, outputInterval: 2400 },
    }),
  );
  const depthAt = new Map(
    result.sections.map((section) => [length - section.chainage, section.depth.at(-1)!]),
  );
  const departures = result.cells.finalFlow.map((flow) => Math.abs(flow / channel.flow - 1));
  return {
    cells: result.cells,
    /** Largest departure of the flow from the inflow, relative. */
    flowError: Math.max(...departures),
    depths: upstream.map((distance) => depthAt.get(distance)!),
  };
}

/** Relative. The flow of a settled run is the same at all faces; what is left dies away by a factor of ten in some ten
 *  minutes. */
const FLOW_ROUNDING = 1e-8;

describe('uniform flow', () => {
  it.each([0.001, 0.003, 0.01, 0.03, 0.1, 0.2])('on a slope of %f', (slope) => {
    const channel = { bottom: 10, side: 0, manning: 0.03, slope, flow: 50 };
    const expected = normalDepth(trapezoid(10, 0), 0.03, slope, 50);
    const { cells, flowError } = settle(channel, [0, 1000], { kind: 'normalDepth', slope }, 10);
    // A scheme that reads the bed step between cells as a wall is wrong by tens of percent on steep slopes.
    for (const depth of cells.finalDepth) {
      expect(Math.abs(depth / expected - 1)).toBeLessThan(2e-3);
    }
    // Faster than Froude 1.5 even flow breaks into roll waves (Vedernikov's limit) that grow from rounding.
    expect(flowError).toBeLessThan(slope < 0.05 ? FLOW_ROUNDING : 1e-3);
  });

  it.each([
    [{ bottom: 6.096, side: 2, manning: 0.025, slope: 0.0016, flow: 11.3267 }, 1.024454],
    [{ bottom: 10, side: 2, manning: 0.013, slope: 0.001, flow: 30 }, 1.091302],
    [{ bottom: 0, side: 3, manning: 0.03, slope: 0.002, flow: 5 }, 1.256458],
    [{ bottom: 4, side: 0, manning: 0.02, slope: 0.02, flow: 20 }, 0.948706],
  ])('in the channel %o: %f m', (channel, expected) => {
    // Normal depths as in the table of published and computed values in exact/steadyFlow.test.ts.
    const outlet = { kind: 'normalDepth', slope: channel.slope } as const;
    const { cells } = settle(channel, [0, 1000], outlet, 10);
    for (const depth of cells.finalDepth) {
      expect(Math.abs(depth / expected - 1)).toBeLessThan(2e-3);
    }
  });
});

/** Depths from the exact integral of the gradually varied flow equation, computed apart from this program. */
describe('gradually varied flow', () => {
  it('backwater of Chow (1959), example 10-1, in SI with α = 1', () => {
    const channel = { bottom: 6.096, side: 2, manning: 0.025, slope: 0.0016, flow: 11.3267 };
    const places = [0, 50, 100, 200, 300, 400, 500, 600, 700, 800, 1000, 1200];
    const expected = [
      1.524, 1.460166, 1.399392, 1.289271, 1.198231, 1.129632, 1.08341, 1.055548, 1.040199, 1.03224,
      1.026298, 1.024885,
    ];
    const outlet = { kind: 'stage', ...steadyStage(1.524) } as const;
    const { depths } = settle(channel, places, outlet, 10);
    depths.forEach((depth, i) => expect(Math.abs(depth - expected[i])).toBeLessThan(5e-4));
  });

  it('backwater in a rectangle from 4 m', () => {
    const channel = { bottom: 10, side: 0, manning: 0.03, slope: 0.001, flow: 50 };
    const expected = [4, 3.8963, 3.75457, 3.55633, 3.2948, 3.16887];
    const outlet = { kind: 'stage', ...steadyStage(4) } as const;
    const { depths } = settle(channel, [0, 200, 500, 1000, 2000, 3000], outlet, 25);
    depths.forEach((depth, i) => expect(Math.abs(depth - expected[i])).toBeLessThan(5e-4));
  });

  it('drawdown to a free overfall', () => {
    const channel = { bottom: 10, side: 0, manning: 0.03, slope: 0.001, flow: 50 };
    // From 1.37 m, 4 mm above critical depth; at the overfall itself the depth is critical, 1.365915 m.
    const places = [0, 1, 5, 20, 100, 500, 2000];
    const expected = [1.365915, 1.45845, 1.56535, 1.74107, 2.09812, 2.62148, 3.00592];
    const { depths } = settle(channel, places, { kind: 'criticalDepth' }, 5);
    // The surface is vertical at the critical section (depth² ∝ distance): near it the error is that of a cell.
    depths.forEach((depth, i) =>
      expect(Math.abs(depth - expected[i])).toBeLessThan(places[i] < 20 ? 0.1 : 6e-3),
    );
  });
});
