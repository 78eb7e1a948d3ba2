import { sectionProperties, sectionShape } from '../../../server/solvers';
import { compound, natural, rectangle, trapezoid } from './sections';

describe('hydraulics of a section', () => {
  it('gives the trapezoid of the handbook formulas', () => {
    // A = (b + z y) y, T = b + 2 z y, P = b + 2 y √(1 + z²), K = A R^(2/3)/n: Chow (1959), table 2-1.
    const { area, topWidth, perimeter, hydraulicRadius, conveyance, depth } = sectionProperties(
      trapezoid(5, 2),
      1.5,
    );
    expect(depth).toBe(1.5);
    expect(area).toBeCloseTo(12, 12);
    expect(topWidth).toBeCloseTo(11, 12);
    expect(perimeter).toBeCloseTo(5 + 3 * Math.sqrt(5), 12);
    expect(hydraulicRadius).toBeCloseTo(12 / (5 + 3 * Math.sqrt(5)), 12);
    expect(conveyance).toBeCloseTo((12 * (12 / (5 + 3 * Math.sqrt(5))) ** (2 / 3)) / 0.025, 9);
  });

  // Conveyance by subdivision of a compound section, Chow (1959) section 6-6 and 2-7: computed independently in double
  // precision from K = Σ A R^(2/3)/n, alpha = Σ(K³/A²)/(K³/A²), beta = Σ(K²/A)/(K²/A); no friction on the divides.
  it.each([
    [2.0, 40, 1874.2948, 1, 1],
    [3.5, 170, 5562.1645, 3.17534, 1.660896],
    [4.0, 280, 8952.6028, 3.164155, 1.58125],
    [5.0, 500, 18626.5798, 2.394911, 1.35791],
    [6.0, 720, 31483.2593, 1.964212, 1.247835],
  ])('divides the compound section at %d m', (stage, area, conveyance, alpha, beta) => {
    const found = sectionProperties(compound(), stage);
    expect(found.area).toBeCloseTo(area, 9);
    expect(found.conveyance).toBeCloseTo(conveyance, 3);
    expect(found.alpha).toBeCloseTo(alpha, 5);
    expect(found.beta).toBeCloseTo(beta, 5);
  });

  it('wets given walls but not the extension above the ends', () => {
    const low = sectionProperties(rectangle(10, 2), 2);
    const high = sectionProperties(rectangle(10, 2), 5);
    expect(low.perimeter).toBeCloseTo(14, 12);
    expect(high.perimeter).toBeCloseTo(14, 12);
    expect(high.area).toBeCloseTo(50, 12);
    expect(high.topWidth).toBeCloseTo(10, 12);
  });

  it('is dry at the bed and below', () => {
    for (const stage of [0, -3]) {
      const { area, topWidth, depth, conveyance } = sectionProperties(rectangle(10), stage);
      expect([area, topWidth, depth, conveyance]).toEqual([0, 0, 0, 0]);
    }
  });

  it('has no end of conveyance without friction', () => {
    expect(sectionProperties(rectangle(10, 10, 0), 1).conveyance).toBe(Infinity);
  });

  it('does not care where the datum lies', () => {
    const near = sectionProperties(natural('a', 0, 0), 3.7);
    const far = sectionProperties(natural('a', 0, 1000), 1003.7);
    expect(far.area).toBeCloseTo(near.area, 9);
    expect(far.conveyance).toBeCloseTo(near.conveyance, 7);
  });

  it('takes a shape as well as a section', () => {
    const section = natural('a', 0, 5);
    expect(sectionProperties(sectionShape(section), 8.2)).toEqual(sectionProperties(section, 8.2));
  });
});
