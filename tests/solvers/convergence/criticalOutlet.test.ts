import { routeCase } from '@/server/solvers';
import {
  buildCase,
  buildSections,
  openRectanglePoints,
  steadyFlow,
} from '../../helpers/solvers/caseBuilders';

/** A free overfall of a mild channel: critical depth y_c = (q²/g)^(1/3) at its brink section (V. T. Chow 1959, ch. 3). */
test.each([5, 20, 60])('%f m³/s leaves 10 m of width at critical depth', (flow) => {
  const slope = 0.0005;
  const result = routeCase(
    buildCase({
      sections: buildSections(0, 1000, 2, 0.03, (x) => openRectanglePoints(10, slope * (1000 - x))),
      upstream: { kind: 'inflow', ...steadyFlow(flow) },
      downstream: { kind: 'criticalDepth' },
      initial: { kind: 'steady' },
      numerics: { cellSize: 10, duration: 600, outputInterval: 600 },
    }),
  );
  const end = result.sections[result.sections.length - 1];
  const critical = ((flow / 10) ** 2 / 9.80665) ** (1 / 3);
  expect(end.depth[1] / critical).toBeGreaterThan(0.99);
  expect(end.depth[1] / critical).toBeLessThan(1.01);
  expect(end.flow[1]).toBeCloseTo(flow, 6);
});
