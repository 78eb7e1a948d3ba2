import { parabolicBowl } from '@/server/solvers/exact/parabolicBowl';
import {
  buildCase,
  buildSectionsAtCells,
  GRAVITY,
  openRectanglePoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Where the shores of swaying water stand, at every twentieth of three periods (W. C. Thacker 1981, J. Fluid Mech. 107,
 *  499-508): cells fall dry and get wet again six times. The shores run some 700 m up and down a parabola. */
const MIDDLE = 2000;
const CELLS = 200;
const DX = (2 * MIDDLE) / CELLS;
const bowl = parabolicBowl(GRAVITY, 10, 1000, 5);
const EVERY = bowl.period / 20;

it('shores run up and draw back where they should, without drift', () => {
  const shift = (time: number) =>
    (5 / Math.sqrt(2 * GRAVITY * 10)) * Math.cos((2 * Math.PI * time) / bowl.period);
  const departures: number[] = [];
  const heights: number[] = [];
  routeChecked(
    buildCase({
      sections: buildSectionsAtCells(2 * MIDDLE, CELLS, 0, (x) =>
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
      numerics: { cellSize: DX, duration: 60 * EVERY, outputInterval: EVERY },
    }),
    {
      onOutput: ({ time, stage }) => {
        const depths = Array.from(stage, (eta, i) => eta - bowl.bed((i + 0.5) * DX - MIDDLE));
        // A film of some centimetres stays behind for a while where the water draws back.
        const wet = (depth: number) => depth > 0.1;
        const left = depths.findIndex(wet) * DX - MIDDLE;
        const right = (depths.findLastIndex(wet) + 1) * DX - MIDDLE;
        departures.push(
          Math.abs(left - 1000 * (-1 - shift(time))),
          Math.abs(right - 1000 * (1 - shift(time))),
        );
        const middle = CELLS / 2;
        heights.push(Math.abs((depths[middle] + depths[middle - 1]) / 2 - bowl.depth(0, time)));
      },
    },
  );
  // Measured: one and a half cells, and 6 cm of the 10 m that the water is deep in the middle.
  expect(Math.max(...departures)).toBeLessThan(2 * DX);
  expect(Math.max(...heights)).toBeLessThan(0.08);
});
