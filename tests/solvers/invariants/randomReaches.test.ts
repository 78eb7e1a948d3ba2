import type { CellResults } from '@/shared/case/resultFile';
import { GRAVITY } from '../../helpers/solvers/caseBuilders';
import { randomCase } from '../../helpers/solvers/randomCase';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/**
 * Small rivers with floods, drawn by chance, plain, with structures, and with all that a valley can have: whatever comes,
 * the numbers stay finite, depths stay positive and no water is lost (routeChecked), speeds stay of this world, and
 * no step is below a floor.
 *
 * A hundred here; REACHES=3000 npx jest tests/solvers/invariants/randomReaches --selectProjects solvers for thousands.
 */
const COUNT = Number(process.env.REACHES ?? 100);

/** m/s. No front is faster than Ritter's (1892), 2 √(g H), of all the height that there is; more comes from a fault. */
const fastestOf = (cells: CellResults): number => {
  const height = Math.max(...cells.peakStage) - Math.min(...cells.bed);
  return Math.max(30, 2 * Math.sqrt(GRAVITY * height));
};

/** Mean step (s): cells of 20 m at the fastest speed above and Courant number 0.8 give 0.5 s; the last of each interval is cut. */
const SHORTEST = 0.1;

const KINDS = [{}, { structures: true }, { valley: true }, { structures: true, valley: true }];

describe('random reaches and floods', () => {
  it.each(Array.from({ length: COUNT }, (_, seed) => seed))('seed %d', (seed) => {
    const caseFile = randomCase(seed, KINDS[Math.floor(seed / 4) % KINDS.length]);
    const { cells, steps } = routeChecked(caseFile);
    expect(Math.max(...cells.peakVelocity.map(Math.abs))).toBeLessThan(fastestOf(cells));
    expect(caseFile.numerics.duration / steps).toBeGreaterThan(SHORTEST);
  });
});
