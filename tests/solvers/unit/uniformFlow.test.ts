import { criticalDepth, normalDepth, sectionProperties } from '../../../server/solvers';
import type { SectionInput } from '../../../shared/case/caseFile';
import { compound, rectangle, trapezoid } from './sections';

const G = 9.81;

// Normal and critical depth, computed with SciPy to 1e-12 from Manning's formula and Q² T = g A³. The first channel is
// that of Chow (1959), examples 6-2 and 4-2 (y_n = 3.36 ft, y_c = 2.15 ft, recalled), the second one of Chaudhry,
// Open-Channel Flow (y_n = 1.09 m, y_c = 0.91 m, recalled).
const CASES: [string, SectionInput, number, number, number, number][] = [
  ['Chow', trapezoid(6.096, 2, 0.025), 11.3267, 0.0016, 1.024454, 0.654712],
  ['Chaudhry', trapezoid(10, 2, 0.013), 30, 0.001, 1.091302, 0.911583],
  ['rectangle 10 m', rectangle(10, 10, 0.03), 50, 0.001, 3.084024, 1.365915],
  ['rectangle 5 m', rectangle(5, 10, 0.015), 20, 0.0004, 2.563824, 1.17711],
  ['trapezoid 3 m', trapezoid(3, 1.5, 0.025), 12, 0.0009, 1.73126, 0.99031],
  ['triangle', trapezoid(0, 3, 0.03), 5, 0.002, 1.256458, 0.892507],
  ['wide', rectangle(200, 10, 0.035), 1000, 0.0005, 3.484024, 1.365915],
  ['steep', rectangle(4, 10, 0.02), 20, 0.02, 0.948706, 1.365915],
];

describe('uniform and critical flow', () => {
  it.each(CASES)('finds both depths: %s', (_, section, flow, slope, normal, critical) => {
    // Tables have six decimals.
    expect(normalDepth(section, flow, slope)).toBeCloseTo(normal, 5);
    expect(criticalDepth(section, flow, G)).toBeCloseTo(critical, 5);
  });

  it('gives Q = A c at critical depth', () => {
    const section = trapezoid(3, 1.5);
    const y = criticalDepth(section, 12, G) ?? NaN;
    const { area, topWidth } = sectionProperties(section, y);
    expect((12 * 12 * topWidth) / (G * area ** 3)).toBeCloseTo(1, 9);
  });

  it('takes the critical depth of least energy in a compound section', () => {
    const section = compound();
    const flow = 330;
    const y = criticalDepth(section, flow, G) ?? NaN;
    const energyAt = (depth: number): number =>
      depth + flow ** 2 / (2 * G * sectionProperties(section, depth).area ** 2);
    for (let depth = 0.5; depth < 8; depth += 0.05) {
      expect(energyAt(depth)).toBeGreaterThanOrEqual(energyAt(y) - 1e-9);
    }
  });

  it('has no answer without flow, slope or friction', () => {
    expect(normalDepth(rectangle(5), 0, 0.001)).toBeNull();
    expect(normalDepth(rectangle(5), 10, 0)).toBeNull();
    expect(normalDepth(rectangle(5, 10, 0), 10, 0.001)).toBeNull();
    expect(criticalDepth(rectangle(5), 0)).toBeNull();
  });
});
