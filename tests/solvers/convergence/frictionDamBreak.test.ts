import { dresslerWave } from '@/server/solvers/exact/dresslerWave';
import { roughFront } from '@/server/solvers/exact/roughFront';
import type { RoughnessFactor } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  GRAVITY,
  openRectanglePoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A dam 6 m high fails on a level dry bed with Chezy friction in a wide channel: Manning's n that varies with the depth,
 *  n = h^(1/6)/C. */
const HEIGHT = 6;
const CELLS = 480;

/** Chezy's C in m^½/s; null: no friction. */
function fail(chezy: number | null, time: number, above: number, below: number) {
  const depths = Array.from({ length: 40 }, (_, i) => 0.0005 * HEIGHT * 4400 ** (i / 39));
  const chezyFriction: RoughnessFactor = {
    from: 0,
    to: above + below,
    part: 'all',
    depths,
    factors: depths.map((h) => h ** (1 / 6)),
  };
  const { cells } = routeChecked(
    buildCase({
      sections: buildSections(0, above + below, 2, chezy ? 1 / chezy : 0, () =>
        openRectanglePoints(1, 0),
      ),
      upstream: { kind: 'wall' },
      downstream: { kind: 'open' },
      roughnessFactors: [chezyFriction],
      initial: { kind: 'dam', chainage: above, stageAbove: HEIGHT, stageBelow: null },
      numerics: {
        cellSize: (above + below) / CELLS,
        duration: time,
        outputInterval: time,
        dryDepth: 1e-4,
      },
    }),
  );
  return cells;
}

describe('a dam break with friction', () => {
  // R. F. Dressler (1952), J. Res. Natl. Bur. Stand. 49(3), 217-225: the first term of a series in R t/c0.
  it('bends the fan as the first correction says, the closer the less friction there is', () => {
    const [time, above, below] = [40, 400, 400];
    const smooth = fail(null, time, above, below);
    const c0 = Math.sqrt(GRAVITY * HEIGHT);
    /** Largest departure from the correction of depth and of velocity, as shares of their largest. */
    const departure = (chezy: number) => {
      const rough = fail(chezy, time, above, below);
      const theory = dresslerWave(GRAVITY, HEIGHT, chezy);
      let [depth, velocity, most, fastest] = [0, 0, 0, 0];
      smooth.chainage.forEach((chainage, i) => {
        const x = chainage - above;
        const xi = x / (c0 * time);
        if (xi < -0.5 || xi > 0.5) return;
        const deeper = theory.depth(x, time) - ((c0 * (2 - xi)) / 3) ** 2 / GRAVITY;
        const slower = theory.velocity(x, time) - (2 * c0 * (1 + xi)) / 3;
        const found = rough.finalDepth[i] - smooth.finalDepth[i];
        const speed = (k: typeof rough) => k.finalFlow[i] / k.finalDepth[i];
        depth = Math.max(depth, Math.abs(found - deeper));
        velocity = Math.max(velocity, Math.abs(speed(rough) - speed(smooth) - slower));
        most = Math.max(most, deeper);
        fastest = Math.max(fastest, -slower);
      });
      return { depth: depth / most, velocity: velocity / fastest };
    };
    // R t/c0 = 0.05 and 0.025.
    const rough = departure(100);
    const smoother = departure(100 * Math.SQRT2);
    expect(rough.depth).toBeLessThan(0.05);
    expect(rough.velocity).toBeLessThan(0.08);
    expect(smoother.velocity).toBeLessThan(0.65 * rough.velocity);
  });

  // G. B. Whitham (1955), Proc. R. Soc. A 227, 399-407, in the closed form of H. Chanson (2006): approximate itself, by some
  // hundredths; without friction the front would be at 2 T.
  it.each([
    [0.01, 50],
    [0.05, 20],
    [0.1, 10],
  ])('holds back the front: Darcy f = %f, T = %d', (darcy, scaledTime) => {
    const theory = roughFront(darcy, scaledTime);
    const above = 1.2 * scaledTime * HEIGHT;
    const below = 1.3 * theory.front * HEIGHT;
    const chezy = Math.sqrt((8 * GRAVITY) / darcy);
    const cells = fail(chezy, scaledTime * Math.sqrt(HEIGHT / GRAVITY), above, below);
    const last = cells.finalDepth.findLastIndex((depth) => depth > 0.003 * HEIGHT);
    const front = (cells.chainage[last] - above) / HEIGHT;
    expect(Math.abs(front / theory.front - 1)).toBeLessThan(0.03);
    expect(front).toBeLessThan(1.3 * scaledTime);
  });
});
