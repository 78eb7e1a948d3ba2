import { buildGrid, sectionProperties } from '../../../server/solvers';
import { ruledSurface, sectionAt } from '../../../server/solvers/geometry/ruledSurface';
import type { CaseFile, SectionInput } from '../../../shared/case/caseFile';
import { compound, natural, rectangle, trapezoid } from './sections';

const moved = (section: SectionInput, along: number, across: number, up: number): SectionInput => ({
  ...section,
  chainage: section.chainage + along,
  points: section.points.map(([x, z]) => [x + across, z + up]),
  roughness: section.roughness.map(([from, n]) => [from + across, n]),
  banks: section.banks && [section.banks[0] + across, section.banks[1] + across],
});

describe('interpolation between sections', () => {
  it.each([
    ['compound', compound()],
    ['natural', natural('a', 0, 3)],
    ['trapezoid', trapezoid(5, 2)],
  ])('is exact between congruent sections: %s', (_, section) => {
    const ruled = ruledSurface(section, moved(section, 100, 13.7, -2));
    const middle = sectionAt(ruled, 0.3);
    for (const height of [0.4, 1.7, 3.1, 4.4, 9]) {
      const bed = Math.min(...section.points.map((p) => p[1]));
      const found = sectionProperties(middle, middle.bed + height);
      const wanted = sectionProperties(section, bed + height);
      expect(middle.bed).toBeCloseTo(bed - 0.6, 12);
      expect(found.area).toBeCloseTo(wanted.area, 8);
      expect(found.conveyance / wanted.conveyance).toBeCloseTo(1, 8);
    }
  });

  it('joins banks with banks and the lowest bed with the lowest bed', () => {
    const a: SectionInput = {
      id: 'a',
      chainage: 0,
      points: [
        [0, 6],
        [10, 4],
        [12, 1],
        [20, 4],
        [40, 6],
      ],
      roughness: [[0, 0.04]],
      banks: [10, 20],
    };
    const b: SectionInput = {
      id: 'b',
      chainage: 100,
      points: [
        [0, 5],
        [30, 3],
        [39, 0],
        [40, 3],
        [50, 5],
      ],
      roughness: [[0, 0.04]],
      banks: [30, 40],
    };
    const middle = sectionAt(ruledSurface(a, b), 0.5);
    const nodes = [...middle.x].map((x, k) => [x, middle.z[k]]);
    expect(nodes).toContainEqual([20, 3.5]); // left banks
    expect(nodes).toContainEqual([25.5, 0.5]); // lowest bed
    expect(nodes).toContainEqual([30, 3.5]); // right banks
    expect(middle.bed).toBe(0.5);
  });

  it('joins a wall with a slope along its height', () => {
    const middle = sectionAt(ruledSurface(rectangle(10, 10), trapezoid(10, 2)), 0.5);
    // Half way from a rectangle to a trapezoid of side slope 2 lies a trapezoid of side slope 1.
    expect(sectionProperties(middle, 4).area).toBeCloseTo((10 + 4) * 4, 10);
    expect(sectionProperties(middle, 4).topWidth).toBeCloseTo(18, 10);
  });

  it('mixes roughness', () => {
    const middle = sectionAt(ruledSurface(rectangle(10, 5, 0.02), rectangle(10, 5, 0.04)), 0.25);
    expect([...middle.zoneN]).toEqual([expect.closeTo(0.025, 12)]);
  });

  it('cuts the reach into equal cells between its ends', () => {
    const caseFile = {
      sections: [rectangle(10), { ...moved(rectangle(10), 103, 0, -1), id: 'b' }],
      numerics: { cellSize: 10 },
    } as CaseFile;
    const grid = buildGrid(caseFile);
    expect(grid.cells).toBe(10);
    expect(grid.dx).toBeCloseTo(10.3, 12);
    expect(grid.chainage[0]).toBeCloseTo(5.15, 12);
    expect(grid.bed[9]).toBeCloseTo(-0.95, 12);
  });
});
