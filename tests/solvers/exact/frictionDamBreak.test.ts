import { alpha1, alpha2, dresslerWave } from '@/server/solvers/exact/dresslerWave';
import { kinematicDamBreak } from '@/server/solvers/exact/kinematicDamBreak';
import { roughFront } from '@/server/solvers/exact/roughFront';

const G = 9.81;

describe("Dressler's fan", () => {
  // Values computed from the formulas apart from this program.
  it.each([
    [-0.78, 0.0028658812, -0.0066417968],
    [-0.12, 0.057784005, -0.21282853],
    [0.54, 0.24578606, -1.5561767],
    [1.42, 1.4249677, -27.808395],
  ])('corrections at ξ = %f', (xi, first, second) => {
    expect(alpha1(xi)).toBeCloseTo(first, 7);
    expect(alpha2(xi)).toBeCloseTo(second, 6);
  });

  it.each([
    [-230.16081, 5.0545579, 1.2574214],
    [-76.720271, 3.4884699, 3.5147858],
    [0, 2.8672093, 4.3533482],
    [76.720271, 2.3554939, 4.7628766],
  ])('6 m failing, C = 40 m^½/s, after 40 s at %f m', (x, depth, velocity) => {
    const wave = dresslerWave(G, 6, 40);
    expect(wave.depth(x, 40)).toBeCloseTo(depth, 6);
    expect(wave.velocity(x, 40)).toBeCloseTo(velocity, 6);
  });

  it('its tip begins where the water is fastest', () => {
    const { xi, x } = dresslerWave(G, 6, 40).tip(40);
    expect(xi).toBeCloseTo(0.2754605, 6);
    expect(x).toBeCloseTo(84.53362, 4);
  });

  it('meets the equations of motion to first order in the friction', () => {
    // What is left must fall a hundredfold when friction falls tenfold.
    const residual = (chezy: number) => {
      const wave = dresslerWave(G, 6, chezy);
      const [t, d] = [20, 1e-3];
      return [-60, 0, 50].map((x) => {
        const [h, u] = [wave.depth(x, t), wave.velocity(x, t)];
        const u_t = (wave.velocity(x, t + d) - wave.velocity(x, t - d)) / (2 * d);
        const u_x = (wave.velocity(x + d, t) - wave.velocity(x - d, t)) / (2 * d);
        const h_x = (wave.depth(x + d, t) - wave.depth(x - d, t)) / (2 * d);
        const h_t = (wave.depth(x, t + d) - wave.depth(x, t - d)) / (2 * d);
        const volume = h_t + u * h_x + h * u_x;
        return (
          Math.abs(volume) + Math.abs(u_t + u * u_x + G * h_x + (G * u * u) / (chezy ** 2 * h))
        );
      });
    };
    const rough = residual(200);
    const smooth = residual(200 * Math.sqrt(10));
    rough.forEach((value, i) => expect(value / smooth[i]).toBeGreaterThan(80));
  });
});

describe('the front of a rough dam-break wave', () => {
  // Darcy f, T: speed, front, start of the tip, depth there; computed apart from this program.
  it.each([
    [0.01, 10, 1.231059, 14.232943, 8.4658854, 0.14781756],
    [0.05, 20, 0.77897746, 21.684662, 3.3693239, 0.37272401],
    [0.1, 100, 0.37737081, 78.302811, -43.394379, 0.65823137],
  ])('f = %f after T = %d', (darcy, time, celerity, front, tipStart, tipDepth) => {
    const found = roughFront(darcy, time);
    expect(found.celerity).toBeCloseTo(celerity, 7);
    expect(found.front).toBeCloseTo(front, 5);
    expect(found.tipStart).toBeCloseTo(tipStart, 5);
    expect(found.tipDepth).toBeCloseTo(tipDepth, 7);
  });

  it('holds the volume that left the fan', () => {
    const [f, T] = [0.05, 20];
    const { front, tipStart, celerity } = roughFront(f, T);
    // Ritter's fan h = (2 - x/T)²/9 beyond the tip's start, against ∫ √(f U² (x_s - x)/4) dx.
    const missing = (T / 27) * (2 - tipStart / T) ** 3;
    const tip = (Math.sqrt(f) / 3) * celerity * (front - tipStart) ** 1.5;
    expect(tip / missing).toBeCloseTo(1, 9);
  });
});

describe('a kinematic dam-break wave', () => {
  it.each([
    [0.5, 0.76018252, 0.45429631],
    [2, 0.47588841, 1.5076941],
    [10, 0.20594156, 5.0181977],
    [50, 0.080163164, 14.573156],
  ])('T = %f: depth and place of the front', (time, frontDepth, front) => {
    const wave = kinematicDamBreak(time);
    expect(wave.frontDepth).toBeCloseTo(frontDepth, 7);
    expect(wave.front).toBeCloseTo(front, 6);
  });

  it('keeps the volume of the reservoir, half H L', () => {
    const wave = kinematicDamBreak(10);
    const count = 20_000;
    let sum = 0;
    for (let i = 0; i < count; i++) {
      sum += (wave.depth(-1 + ((i + 0.5) * (wave.front + 1)) / count) * (wave.front + 1)) / count;
    }
    expect(sum).toBeCloseTo(0.5, 4);
  });
});
