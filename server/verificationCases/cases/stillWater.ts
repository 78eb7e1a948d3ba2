import { bumpBed } from '../../solvers/exact/bumpFlow';
import { caseOf, sectionsAtCells, steadyStage, wideChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';
import { wildReach } from '../reaches/naturalReach';

const boundReason =
  'Only the rounding of double precision may remain: 10⁻¹² m on stages of some metres, and 10⁻⁹ m³/s in sections that ' +
  'carry up to a thousand.';
const bounds = { stageMax: 1e-12, flowMax: 1e-9, volume: 1e-12 };

const LEVEL = 5;
const SECTIONS = 200;
const SPACING = 50;

/** Still water over 200 sections without likeness to each other, a quarter of them above the water. */
const overWildBed: PublishedCase = {
  id: 'still-wild',
  group: 'still',
  title: 'Still water between dry islands',
  setup:
    'Two hundred sections drawn by chance, 50 m apart, no two alike, many with their whole bed above the water. The ' +
    'water stands level at 5 m between walls for a quarter of an hour. It must not move.',
  source:
    'The property of exact balance: A. Bermúdez and M. E. Vázquez (1994), Upwind methods for hyperbolic conservation ' +
    'laws with source terms, Computers & Fluids 23(8), 1049-1071 [reference from memory]. The exact answer is the ' +
    'level itself.',
  shows:
    'Pressure on the walls of changing sections and the weight of water on the bed cancel exactly, at shores too: no ' +
    'current is invented.',
  doesNotShow: 'Anything about water that moves.',
  boundReason,
  grids: [199, 398, 796],
  bounds,
  problem: (cells) => {
    const sections = wildReach(1, SECTIONS, SPACING);
    const length = (SECTIONS - 1) * SPACING;
    let beds: readonly number[] = [];
    return {
      caseFile: caseOf('Still water between dry islands', {
        sections,
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: { kind: 'still', stage: LEVEL },
        numerics: { cellSize: length / cells, duration: 900, outputInterval: 900 },
      }),
      read: ({ cells: found }) => {
        // Where the ground stands above the water the stage is the ground; a film below the dry depth counts as none.
        beds = found.bed.map((bed) => (LEVEL - bed > 1e-3 ? LEVEL : bed));
        return {
          along: 'chainage',
          at: found.chainage,
          bed: found.bed,
          stage: found.finalStage,
          flow: found.finalFlow,
        };
      },
      exact: (x) => ({
        stage: beds[Math.min(cells - 1, Math.floor((x / length) * cells))],
        flow: 0,
      }),
    };
  },
};

const BUMP_LENGTH = 25;
const BUMP_LEVEL = 0.1;

/** The bump stands out of the water: between x = 10 ± √2 the bed is dry. */
const overBump: PublishedCase = {
  id: 'still-bump',
  group: 'still',
  title: 'Still water, the bump dry',
  setup:
    'Channel of 25 m with a parabolic bump 0.2 m high; the water stands 0.1 m deep beside it for five minutes, held at ' +
    'the outlet.',
  source:
    'N. Goutal and F. Maurel, editors (1997), Proceedings of the 2nd Workshop on Dam-Break Wave Simulation, EDF report ' +
    'HE-43/97/016/B [parameters from memory].',
  shows: 'A shore on a smooth bed does not creep.',
  doesNotShow: 'How a shore moves; see the parabolic trough.',
  boundReason,
  grids: [50, 100, 200],
  bounds,
  problem: (cells) => ({
    caseFile: caseOf('Still water, the bump dry', {
      sections: sectionsAtCells(BUMP_LENGTH, cells, 0, (x) => wideChannel(1, bumpBed(x))),
      upstream: { kind: 'wall' },
      downstream: { kind: 'stage', ...steadyStage(BUMP_LEVEL) },
      initial: { kind: 'still', stage: BUMP_LEVEL },
      numerics: { cellSize: BUMP_LENGTH / cells, duration: 300, outputInterval: 300 },
    }),
    exact: (x) => ({
      stage: BUMP_LEVEL - bumpBed(x) > 1e-3 ? BUMP_LEVEL : bumpBed(x),
      flow: 0,
    }),
  }),
};

export const stillWater: readonly PublishedCase[] = [overWildBed, overBump];
