import type { CaseFile, Downstream, Initial } from '@/shared/case/caseFile';
import { buildCase, steadyStage } from '../../helpers/solvers/caseBuilders';
import { naturalReach, wildReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { seededRandom } from '../../helpers/solvers/seededRandom';

/** A hundred small rivers with floods, drawn by chance: whatever comes, the numbers stay finite, depths stay
 *  positive and no water is lost (routeChecked), and speeds stay of this world. */
function randomCase(seed: number): CaseFile {
  const random = seededRandom(1000 + seed);
  const pick = <T>(choices: readonly T[]): T => choices[Math.floor(random() * choices.length)];
  const slope = 10 ** (-4 + 3 * random());
  const wild = seed % 4 === 3;
  const sections = wild
    ? wildReach(seed, 8, 60)
    : naturalReach(seed, { length: 1200, spacing: 200, slope });
  const length = sections[sections.length - 1].chainage;
  const bed = Math.min(...sections[sections.length - 1].points.map(([, z]) => z));
  const crest = Math.min(...sections[0].points.map(([, z]) => z));
  const base = 100 * random() ** 2;
  const peak = base + 400 * random();
  const downstream = pick<Downstream>([
    { kind: 'normalDepth', slope: Math.max(slope, 1e-4) },
    { kind: 'stage', times: [0, 900], stages: [bed + 3 * random(), bed + 4 * random()] },
    { kind: 'rating', stages: [bed + 0.2, bed + 3, bed + 8], flows: [0, 120, 900] },
    { kind: 'criticalDepth' },
    { kind: 'open' },
    { kind: 'wall' },
  ]);
  const initial = pick<Initial>([
    { kind: 'still', stage: bed + 4 * random() },
    { kind: 'still', stage: bed - 1 },
    { kind: 'dam', chainage: length / 2, stageAbove: crest + 6 * random(), stageBelow: null },
    {
      kind: 'profile',
      chainages: [0, length],
      stages: [crest + 1 + 2 * random(), bed + 1 + 2 * random()],
      flows: [5, 5],
    },
    ...(wild || downstream.kind === 'wall' ? [] : [{ kind: 'steady' } as const]),
  ]);
  return buildCase({
    sections,
    upstream: pick<CaseFile['upstream']>([
      { kind: 'inflow', times: [0, 300, 900], flows: [base, peak, base] },
      { kind: 'inflow', times: [0, 1], flows: [0, peak] },
      { kind: 'wall' },
      { kind: 'stage', ...steadyStage(crest + 3 * random()) },
    ]),
    downstream,
    laterals: pick([
      [],
      [{ from: 0.3 * length, to: 0.6 * length, times: [0, 600], flows: [0, 80 * random()] }],
      [{ from: 0.5 * length, to: 0.5 * length, times: [0], flows: [-60 * random()] }],
    ]),
    initial,
    numerics: {
      cellSize: pick([20, 30, 45]),
      duration: 900,
      outputInterval: 300,
      order: pick([1, 2, 2]),
    },
  });
}

/** m/s. Falling 20 m gives 20 m/s, a dry front from 15 m depth 24 m/s; more comes from a fault. */
const FASTEST = 30;

describe('random reaches and floods', () => {
  it.each(Array.from({ length: 100 }, (_, seed) => seed))('seed %d', (seed) => {
    const { cells } = routeChecked(randomCase(seed));
    expect(Math.max(...cells.peakVelocity.map(Math.abs))).toBeLessThan(FASTEST);
  });
});
