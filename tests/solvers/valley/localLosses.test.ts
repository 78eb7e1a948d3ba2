import type { LocalLoss, SectionInput } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  GRAVITY,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const LENGTH = 1000;
const FLOW = 100;

/** A level frictionless channel, 40 m wide, that narrows to 20 m over 200 m, and widens again. */
function narrows(): SectionInput[] {
  const widthAt = (x: number) =>
    40 - 20 * Math.min(1, Math.max(0, (300 - Math.abs(x - 500)) / 200));
  return buildSections(0, LENGTH, 11, 0, (x) => trapezoidPoints(widthAt(x), 0, 0, 10));
}

const everywhere = (contraction: number, expansion: number): LocalLoss[] => [
  { from: 0, to: LENGTH, contraction, expansion },
];

function steady(localLosses: LocalLoss[]) {
  const { cells } = routeChecked(
    buildCase({
      sections: narrows(),
      upstream: { kind: 'inflow', ...steadyFlow(FLOW) },
      downstream: { kind: 'stage', ...steadyStage(3) },
      initial: { kind: 'steady' },
      numerics: { cellSize: 10, duration: 600, outputInterval: 600 },
      localLosses,
    }),
  );
  expect(Math.max(...cells.finalFlow.map((q) => Math.abs(q / FLOW - 1)))).toBeLessThan(1e-4);
  const widthAt = (x: number) => (Math.abs(x - 500) <= 100 ? 20 : 40);
  /** Velocity head and energy level (m) in a straight part, x in the middle of a cell */
  const at = (x: number) => {
    const stage = cells.finalStage[(x - 5) / 10];
    const head = (FLOW / (widthAt(x) * stage)) ** 2 / (2 * GRAVITY);
    return { head, energy: stage + head };
  };
  return { above: at(95), throat: at(495), below: at(905) };
}

describe('losses at contractions and expansions', () => {
  it('take their share of the change of velocity head from the energy of steady flow', () => {
    // H1 - H2 = C |u2² - u1²|/2g; 0.1 and 0.3 for gradual transitions, 0.3 and 0.5 at bridges: common practice.
    for (const [contraction, expansion] of [
      [0.1, 0.3],
      [0.3, 0.5],
    ]) {
      const { above, throat, below } = steady(everywhere(contraction, expansion));
      const lostIn = above.energy - throat.energy;
      const lostOut = throat.energy - below.energy;
      // Without coefficients the flow keeps its energy to 0.3 mm over either transition.
      expect(Math.abs(lostIn - contraction * (throat.head - above.head))).toBeLessThan(4e-4);
      expect(Math.abs(lostOut - expansion * (throat.head - below.head))).toBeLessThan(4e-4);
      expect(lostOut).toBeGreaterThan(0.02);
    }
    const free = steady([]);
    expect(Math.abs(free.above.energy - free.throat.energy)).toBeLessThan(4e-4);
    expect(Math.abs(free.throat.energy - free.below.energy)).toBeLessThan(4e-4);
  });

  it('act in their stretch alone', () => {
    const { above, throat, below } = steady([{ ...everywhere(0.3, 0.5)[0], from: 500 }]);
    expect(Math.abs(above.energy - throat.energy)).toBeLessThan(4e-4);
    expect(throat.energy - below.energy).toBeGreaterThan(0.03);
  });

  it('act on flow in either direction, mirrored', () => {
    // A wave from either end into a channel that narrows one way: what one does the other does mirrored.
    const there = buildSections(0, LENGTH, 3, 0.02, (x) =>
      trapezoidPoints(40 - 0.02 * x, 0, 0, 10),
    );
    const back = buildSections(0, LENGTH, 3, 0.02, (x) =>
      trapezoidPoints(40 - 0.02 * (LENGTH - x), 0, 0, 10),
    );
    const run = (sections: SectionInput[], stages: [number, number], losses: LocalLoss[]) =>
      routeChecked(
        buildCase({
          sections,
          upstream: { kind: 'wall' },
          downstream: { kind: 'wall' },
          initial: { kind: 'dam', chainage: 500, stageAbove: stages[0], stageBelow: stages[1] },
          numerics: { cellSize: 20, duration: 60, outputInterval: 60 },
          localLosses: losses,
        }),
      ).cells;
    const forward = run(there, [4, 2], everywhere(0.3, 0.5));
    const backward = run(back, [2, 4], everywhere(0.3, 0.5));
    const last = forward.finalStage.length - 1;
    forward.finalStage.forEach((stage, i) => {
      expect(Math.abs(backward.finalStage[last - i] - stage)).toBeLessThan(1e-9);
      expect(Math.abs(backward.finalFlow[last - i] + forward.finalFlow[i])).toBeLessThan(1e-7);
    });
    const free = run(there, [4, 2], []);
    expect(Math.abs(free.finalFlow[30] - forward.finalFlow[30])).toBeGreaterThan(1);
  });

  it('do nothing to still water', () => {
    const { cells } = routeChecked(
      buildCase({
        sections: naturalReach(2, { length: LENGTH, spacing: 100, slope: 0.003 }),
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: { kind: 'still', stage: 3 },
        numerics: { cellSize: 20, duration: 600, outputInterval: 600 },
        localLosses: everywhere(1, 1),
      }),
    );
    const moved = cells.finalStage.map((eta, i) => Math.abs(eta - cells.initialStage[i]));
    expect(Math.max(...moved)).toBeLessThan(1e-12);
  });
});
