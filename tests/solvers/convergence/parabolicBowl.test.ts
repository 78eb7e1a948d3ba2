import { parabolicBowl } from '@/server/solvers/exact/parabolicBowl';
import {
  buildCase,
  buildSections,
  GRAVITY,
  openRectanglePoints,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Water swaying in a parabolic trough for two and a quarter periods: shores that run up and draw back, without
 *  shock or friction, so that the order of the scheme at a moving shore shows. */
const MIDDLE = 2000;
const bowl = parabolicBowl(GRAVITY, 10, 1000, 5);

function depthError(cells: number): number {
  const time = 2.25 * bowl.period;
  const { cells: found } = routeChecked(
    buildCase({
      sections: buildSections(0, 2 * MIDDLE, 401, 0, (x) =>
        openRectanglePoints(1, bowl.bed(x - MIDDLE)),
      ),
      upstream: { kind: 'wall' },
      downstream: { kind: 'wall' },
      initial: {
        kind: 'profile',
        chainages: [0, 2 * MIDDLE],
        stages: [bowl.stage(-MIDDLE, 0), bowl.stage(MIDDLE, 0)],
        flows: [0, 0],
      },
      numerics: { cellSize: (2 * MIDDLE) / cells, duration: time, outputInterval: time },
    }),
  );
  return errorNorms(found.chainage, found.finalDepth, (x) => bowl.depth(x - MIDDLE, time)).mean;
}

describe('moving shores in a parabolic trough', () => {
  it('follows the exact depth at nearly second order', () => {
    const table = orderTable('Parabolic trough depth', [50, 100, 200], depthError);
    expect(table.finest).toBeLessThan(0.02);
    expect(table.order).toBeGreaterThan(1.5);
  });
});
