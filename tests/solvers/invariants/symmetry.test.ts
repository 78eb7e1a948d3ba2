import type { CaseFile, SectionInput } from '@/shared/case/caseFile';
import { buildCase } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const LENGTH = 2000;
const sections = naturalReach(5, { length: LENGTH, spacing: 200, slope: 0 });

function failing(reach: SectionInput[], stageAbove: number, stageBelow: number): CaseFile {
  return buildCase({
    sections: reach,
    upstream: { kind: 'wall' },
    downstream: { kind: 'wall' },
    initial: { kind: 'dam', chainage: LENGTH / 2, stageAbove, stageBelow },
    numerics: { cellSize: 20, duration: 400, outputInterval: 400 },
  });
}

describe('a failing dam in a natural reach', () => {
  const there = routeChecked(failing(sections, 6, 1.5)).cells;

  it('seen from the other end is its mirror image', () => {
    const mirrored = sections
      .map((section) => ({ ...section, chainage: LENGTH - section.chainage }))
      .reverse();
    const back = routeChecked(failing(mirrored, 1.5, 6)).cells;
    const last = there.chainage.length - 1;
    // Rounding of sums taken in another order, grown over some 400 steps.
    there.finalStage.forEach((stage, i) => {
      expect(Math.abs(back.finalStage[last - i] - stage)).toBeLessThan(1e-8);
      expect(Math.abs(back.finalFlow[last - i] + there.finalFlow[i])).toBeLessThan(1e-6);
    });
  });

  it('does not know the height of the datum', () => {
    const datum = 512;
    const lifted = sections.map((section) => ({
      ...section,
      points: section.points.map(([offset, z]): [number, number] => [offset, z + datum]),
    }));
    const above = routeChecked(failing(lifted, 6 + datum, 1.5 + datum)).cells;
    there.finalStage.forEach((stage, i) =>
      expect(Math.abs(above.finalStage[i] - datum - stage)).toBeLessThan(1e-8),
    );
  });

  it('does not know which bank is left', () => {
    const turned = sections.map((section): SectionInput => {
      const width = section.points[section.points.length - 1][0];
      const flip = (offset: number) => width - offset;
      const [left, right] = section.banks!;
      const [[, n0], [, n1], [, n2]] = section.roughness;
      return {
        ...section,
        points: section.points.map(([y, z]): [number, number] => [flip(y), z]).reverse(),
        banks: [flip(right), flip(left)],
        roughness: [
          [0, n2],
          [flip(right), n1],
          [flip(left), n0],
        ],
      };
    });
    const other = routeChecked(failing(turned, 6, 1.5)).cells;
    there.finalStage.forEach((stage, i) =>
      expect(Math.abs(other.finalStage[i] - stage)).toBeLessThan(1e-8),
    );
  });
});
