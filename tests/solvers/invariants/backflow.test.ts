import type { CaseFile, SectionInput } from '@/shared/case/caseFile';
import { buildCase, steadyStage } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const LENGTH = 3000;
const sections = naturalReach(17, { length: LENGTH, spacing: 200, slope: 0 });
const mirrored = sections
  .map((section): SectionInput => ({ ...section, chainage: LENGTH - section.chainage }))
  .reverse();

describe('water that flows up the reach', () => {
  const between = (
    reach: SectionInput[],
    ends: Pick<CaseFile, 'upstream' | 'downstream'>,
    at: number,
  ) =>
    routeChecked(
      buildCase({
        sections: reach,
        ...ends,
        laterals: [{ from: at, to: at + 400, times: [0, 3600], flows: [5, 20] }],
        initial: { kind: 'still', stage: 4.5 },
        numerics: { cellSize: 25, duration: 7200, outputInterval: 1800 },
      }),
    ).cells;

  it('is the mirror image of the same water flowing down: friction, banks, tributary and all', () => {
    const high = { kind: 'stage' as const, times: [0, 1800], stages: [4.5, 5.2] };
    const low = { kind: 'stage', ...steadyStage(4.5) } as const;
    const down = between(sections, { upstream: high, downstream: low }, 1000);
    const up = between(mirrored, { upstream: low, downstream: high }, LENGTH - 1400);
    const last = down.chainage.length - 1;
    expect(Math.min(...down.finalFlow)).toBeGreaterThan(50);
    down.finalStage.forEach((stage, i) => {
      expect(Math.abs(up.finalStage[last - i] - stage)).toBeLessThan(1e-8);
      expect(Math.abs(up.finalFlow[last - i] + down.finalFlow[i])).toBeLessThan(1e-6);
    });
  });

  it('turns with a tide at the outlet, and fills and empties the reach by what passes there', () => {
    const period = 14_400;
    const times = Array.from({ length: 97 }, (_, k) => (k * period) / 48);
    const { sections: found, volume } = routeChecked(
      buildCase({
        sections,
        upstream: { kind: 'wall' },
        downstream: {
          kind: 'stage',
          times,
          stages: times.map((time) => 5 - 0.5 * Math.cos((2 * Math.PI * time) / period)),
        },
        initial: { kind: 'still', stage: 4.5 },
        numerics: { cellSize: 25, duration: 2 * period, outputInterval: 600 },
      }),
    );
    const outlet = found[found.length - 1];
    expect(Math.min(...outlet.flow)).toBeLessThan(-20);
    expect(Math.max(...outlet.flow)).toBeGreaterThan(20);
    // The reach is short for so slow a tide: its head follows to a decimetre, and two tides leave what they brought.
    const head = found[0];
    head.stage.forEach((stage, k) => expect(Math.abs(stage - outlet.stage[k])).toBeLessThan(0.15));
    expect(Math.abs(volume.outflow)).toBeLessThan(0.02 * volume.initial);
  });
});
