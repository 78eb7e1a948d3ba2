import type { Initial } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  openRectanglePoints,
  steadyFlow,
} from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

function start(initial: Initial) {
  return routeChecked(
    buildCase({
      sections: buildSections(0, 1000, 2, 0.03, (x) => openRectanglePoints(10, (1000 - x) / 500)),
      upstream: { kind: 'wall' },
      downstream: { kind: 'wall' },
      initial,
      numerics: { cellSize: 10, duration: 0.1, outputInterval: 0.1 },
    }),
  );
}

describe('initial states', () => {
  it('still water is level and leaves high ground dry', () => {
    const { cells } = start({ kind: 'still', stage: 1 });
    cells.chainage.forEach((_, i) =>
      expect(cells.initialStage[i]).toBeCloseTo(Math.max(1, cells.bed[i]), 9),
    );
  });

  it('a profile is linear between its points', () => {
    const { cells, sections } = start({
      kind: 'profile',
      chainages: [0, 400, 1000],
      stages: [5, 4, 3.4],
      flows: [10, 10, 30],
    });
    cells.chainage.forEach((x, i) =>
      expect(cells.initialStage[i]).toBeCloseTo(x < 400 ? 5 - x / 400 : 4 - (x - 400) / 1000, 9),
    );
    expect(sections[0].stage[0]).toBeCloseTo(5, 2);
  });

  it('a dam parts two levels, or water from dry bed', () => {
    const above = start({ kind: 'dam', chainage: 500, stageAbove: 6, stageBelow: 3 });
    const dry = start({ kind: 'dam', chainage: 500, stageAbove: 6, stageBelow: null });
    above.cells.chainage.forEach((x, i) => {
      expect(above.cells.initialStage[i]).toBeCloseTo(x < 500 ? 6 : 3, 9);
      expect(dry.cells.initialStage[i]).toBeCloseTo(x < 500 ? 6 : dry.cells.bed[i], 9);
    });
  });

  it.each([30, 200, 600])(
    'steady flow of %d m³/s in a natural reach stays as it starts',
    (flow) => {
      const result = routeChecked(
        buildCase({
          sections: naturalReach(21, { length: 8000, spacing: 200, slope: 0.001 }),
          upstream: { kind: 'inflow', ...steadyFlow(flow) },
          downstream: { kind: 'normalDepth', slope: 0.001 },
          initial: { kind: 'steady' },
          numerics: { cellSize: 25, duration: 4 * 3600, outputInterval: 3600 },
        }),
      );
      const { finalStage, initialStage, peakFlow, finalFlow } = result.cells;
      // A millimetre is a tenth of what a levelled water mark is good for (common practice).
      finalStage.forEach((stage, i) =>
        expect(Math.abs(stage - initialStage[i])).toBeLessThan(1e-3),
      );
      peakFlow.forEach((peak) => expect(Math.abs(peak / flow - 1)).toBeLessThan(1e-4));
      // A slope limiter that switches between the stages of a step cancels in their mean; from step to step it does not.
      finalFlow.forEach((found) => expect(Math.abs(found / flow - 1)).toBeLessThan(1e-5));
      expect(result.warnings.map(({ code }) => code)).not.toContain('initialNotSettled');
    },
  );
});
