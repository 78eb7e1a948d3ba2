import { parabolicBowl } from '../../solvers/exact/parabolicBowl';
import { caseOf, GRAVITY, sectionsAtCells, wideChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

const MIDDLE = 2000;
const LENGTH = 2 * MIDDLE;
const PERIODS = 2.25;

export const parabolicTrough: PublishedCase = {
  id: 'parabolic-trough',
  group: 'waves',
  title: 'Water swaying in a parabolic trough',
  setup:
    'Water 10 m deep sways without friction in a parabolic trough 2 km wide at rest, up to 5 m/s. Its surface stays plane while ' +
    'both shores run up and draw back. Compared after two and a quarter periods.',
  source:
    'W. C. Thacker (1981), Some exact solutions to the nonlinear shallow-water wave equations, Journal of Fluid Mechanics ' +
    '107, 499-508.',
  shows:
    'Wetting and drying: a shore moves as it should, with no water lost and no shock invented.',
  doesNotShow: 'Friction, which stops a real shore.',
  boundReason:
    'A quarter above what was left when the bounds were set. The inner water converges at second order; on the finest grid what is ' +
    'left is the error of the cells at the shores, which are of first order.',
  grids: [50, 100, 200, 400],
  bounds: { stageL1: 9.4e-3, flowL1: 8.3e-2, stageOrder: 0.65, flowOrder: 1.2, volume: 1e-12 },
  problem: (cells) => {
    const bowl = parabolicBowl(GRAVITY, 10, 1000, 5);
    const time = PERIODS * bowl.period;
    return {
      caseFile: caseOf('Water swaying in a parabolic trough', {
        sections: sectionsAtCells(LENGTH, cells, 0, (x) => wideChannel(1, bowl.bed(x - MIDDLE))),
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: {
          kind: 'profile',
          chainages: [0, LENGTH],
          stages: [bowl.stage(-MIDDLE, 0), bowl.stage(MIDDLE, 0)],
          flows: [0, 0],
        },
        numerics: { cellSize: LENGTH / cells, duration: time, outputInterval: time },
      }),
      exact: (x) => {
        const depth = bowl.depth(x - MIDDLE, time);
        return {
          stage: bowl.bed(x - MIDDLE) + depth,
          flow: depth * bowl.velocity(time),
        };
      },
    };
  },
};
