import type { RoughnessFactor } from '../../../shared/case/caseFile';
import { dresslerWave } from '../../solvers/exact/dresslerWave';
import { caseOf, GRAVITY, sectionsAt, wideChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

const HEIGHT = 6;
/** Chezy's C, m^½/s. */
const CHEZY = 100;
const TIME = 40;
const DAM = 400;
const LENGTH = 2 * DAM;
/** Part of the fan that is compared, in x/(c₀ t): the tip is no part of the theory. */
const SHARE = 0.5;

/** Chezy friction as Manning's n that varies with depth, n = h^(1/6)/C. */
function chezyFriction(): RoughnessFactor {
  const depths = Array.from({ length: 40 }, (_, i) => 0.0005 * HEIGHT * 4400 ** (i / 39));
  return {
    from: 0,
    to: LENGTH,
    part: 'all',
    depths,
    factors: depths.map((depth) => depth ** (1 / 6)),
  };
}

export const roughDamBreak: PublishedCase = {
  id: 'dam-rough',
  group: 'dam',
  title: 'Dam break with friction',
  setup:
    `A dam ${HEIGHT} m high is gone at once on a level dry bed with Chezy friction, C = ${CHEZY} m^½/s, in a channel of unit width. ` +
    `Compared ${TIME} s later in the inner half of the fan.`,
  source:
    'R. F. Dressler (1952), Hydraulic resistance effect upon the dam-break functions, Journal of Research of the National Bureau of ' +
    'Standards 49(3), 217-225 [formulas from memory; they meet both equations of motion to first order].',
  shows:
    'How friction holds the water back: at the dam it stands higher and runs slower than without.',
  doesNotShow:
    'The tip, where friction rules. The theory is itself the first term of a series: what is left between both does not go to ' +
    'nothing on finer grids.',
  boundReason:
    'A quarter above what was left when the bounds were set; no order is asked for, since the theory is approximate. Routed without ' +
    'friction the mean differences are five times as large of stage, and eight times of flow.',
  grids: [120, 240, 480],
  bounds: { stageL1: 7.2e-3, flowL1: 0.025, volume: 1e-12 },
  problem: (cells) => {
    const theory = dresslerWave(GRAVITY, HEIGHT, CHEZY);
    const reach = SHARE * Math.sqrt(GRAVITY * HEIGHT) * TIME;
    return {
      caseFile: caseOf('Dam break with friction', {
        sections: sectionsAt([0, LENGTH], 1 / CHEZY, () => wideChannel(1, 0)),
        upstream: { kind: 'wall' },
        downstream: { kind: 'open' },
        roughnessFactors: [chezyFriction()],
        initial: { kind: 'dam', chainage: DAM, stageAbove: HEIGHT, stageBelow: null },
        numerics: {
          cellSize: LENGTH / cells,
          duration: TIME,
          outputInterval: TIME,
          dryDepth: 1e-4,
        },
      }),
      from: DAM - reach,
      to: DAM + reach,
      exact: (x) => {
        const depth = theory.depth(x - DAM, TIME);
        return { stage: depth, flow: depth * theory.velocity(x - DAM, TIME) };
      },
    };
  },
};
