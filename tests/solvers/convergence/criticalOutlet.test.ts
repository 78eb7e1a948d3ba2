import { routeCase } from '@/server/solvers';
import type { Downstream } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  openRectanglePoints,
  steadyFlow,
} from '../../helpers/solvers/caseBuilders';

const SLOPE = 0.0005;

/** Depth and flow at the end of a mild channel, 10 m wide, once they are steady. */
function atTheEnd(flow: number, downstream: Downstream) {
  const result = routeCase(
    buildCase({
      sections: buildSections(0, 1000, 2, 0.03, (x) => openRectanglePoints(10, SLOPE * (1000 - x))),
      upstream: { kind: 'inflow', ...steadyFlow(flow) },
      downstream,
      initial: { kind: 'steady' },
      numerics: { cellSize: 10, duration: 600, outputInterval: 600 },
    }),
  );
  const end = result.sections[result.sections.length - 1];
  expect(end.flow[1]).toBeCloseTo(flow, 6);
  return end.depth[1];
}

/** Critical depth y_c = (q²/g)^(1/3): V. T. Chow 1959, ch. 3. */
const criticalDepth = (flow: number) => ((flow / 10) ** 2 / 9.80665) ** (1 / 3);

test.each([5, 20, 60])('%f m³/s leaves a free overfall at critical depth', (flow) => {
  const share = atTheEnd(flow, { kind: 'criticalDepth' }) / criticalDepth(flow);
  expect(Math.abs(share - 1)).toBeLessThan(0.01);
});

test.each<Downstream>([
  { kind: 'normalDepth', slope: 0.5 },
  { kind: 'rating', stages: [0, 0.1, 5], flows: [0, 200, 2000] },
])(
  'an outlet that asks for more than critical flow draws the water to critical depth: %j',
  (outlet) => {
    expect(Math.abs(atTheEnd(20, outlet) / criticalDepth(20) - 1)).toBeLessThan(0.01);
  },
);
