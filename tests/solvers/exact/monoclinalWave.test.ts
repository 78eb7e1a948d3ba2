import { monoclinalWave } from '@/server/solvers/exact/monoclinalWave';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { manningConveyance } from '@/server/solvers/exact/uniformFlow';

const [G, N, SLOPE] = [9.81, 0.03, 0.001];
const section = trapezoid(20, 2);
const wave = monoclinalWave(section, G, N, SLOPE, 3, 1.5);

describe('a flood front of constant form', () => {
  it('joins both uniform flows at the speed of their difference', () => {
    const uniform = (h: number) => manningConveyance(section, N, h) * Math.sqrt(SLOPE);
    expect(wave.depth(-150_000)).toBeCloseTo(3, 6);
    expect(wave.depth(60_000)).toBeCloseTo(1.5, 6);
    expect(wave.flow(-150_000)).toBeCloseTo(uniform(3), 4);
    expect(wave.flow(60_000)).toBeCloseTo(uniform(1.5), 4);
    const areas = section.area(3) - section.area(1.5);
    expect(wave.speed).toBeCloseTo((uniform(3) - uniform(1.5)) / areas, 12);
  });

  it('meets both equations of motion', () => {
    // At a fixed place: A_t = -U A', so volume is A_t + Q_x = 0; momentum by central differences over 1 m.
    const d = 0.5;
    for (const xi of [-3000, -800, -10, 0, 12.3, 400, 1500]) {
      const slopeOf = (f: (x: number) => number) => (f(xi + d) - f(xi - d)) / (2 * d);
      const area = (x: number) => section.area(wave.depth(x));
      const rate = -wave.speed * slopeOf(area);
      expect(Math.abs(rate + slopeOf(wave.flow))).toBeLessThan(1e-9);
      const flow = wave.flow(xi);
      const k = manningConveyance(section, N, wave.depth(xi));
      const terms = [
        -wave.speed * slopeOf(wave.flow),
        slopeOf((x) => wave.flow(x) ** 2 / area(x)),
        G * area(xi) * (slopeOf(wave.depth) - SLOPE),
        (G * area(xi) * flow * flow) / (k * k),
      ];
      // Of some 0.3 m³/s².
      expect(Math.abs(terms.reduce((a, b) => a + b))).toBeLessThan(1e-6);
    }
  });

  it('gives the same depth whatever was asked before', () => {
    const other = monoclinalWave(section, G, N, SLOPE, 3, 1.5);
    expect(other.depth(777)).toBeCloseTo(wave.depth(777), 10);
    expect(wave.depth(0)).toBe(2.25);
  });

  it('refuses a front that breaks', () => {
    expect(() => monoclinalWave(section, G, N, 0.01, 3, 0.2)).toThrow(RangeError);
  });
});
