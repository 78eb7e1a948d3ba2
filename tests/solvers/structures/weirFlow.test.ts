import {
  broadCoefficient,
  crestHead,
  crestOf,
  drowning,
  pieceHead,
  rehbock,
  sharpCoefficient,
} from '@/server/solvers/structures/crestFlow';
import { GRAVITY } from '../../helpers/solvers/caseBuilders';

const level = (width: number) =>
  crestOf([
    [0, 0],
    [width, 0],
  ]);

describe('flow over a crest', () => {
  /** Q = C_d (2/3)^1.5 sqrt(g) b H^1.5 (Bos 1989; Chow 1959; ISO 3846, from memory); numbers computed from it. */
  it.each([
    [0.5, 10, 1.0, 6.027714],
    [1.0, 10, 1.0, 17.048949],
    [1.0, 10, 0.85, 14.491607],
    [2.0, 25, 0.95, 114.526562],
  ])('broad: H %d m, b %d m, C_d %d', (head, width, coefficient, flow) => {
    const q = coefficient * broadCoefficient(GRAVITY) * crestHead(level(width), head);
    expect(Math.abs(q / flow - 1)).toBeLessThan(1e-6);
  });

  /** Rehbock's short form 0.611 + 0.08 h/P (Henderson 1966, from memory); numbers computed from it. */
  it.each([
    [0.1, 0.5, 0.05855],
    [0.3, 0.5, 0.319761],
    [0.5, 1.0, 0.679664],
    [0.6, 0.4, 1.003235],
  ])('sharp: h %d m, P %d m', (head, height, flow) => {
    const q = rehbock(head, height) * sharpCoefficient(GRAVITY) * crestHead(level(1), head);
    expect(Math.abs(q / flow - 1)).toBeLessThan(1e-5);
  });

  /** Villemonte (1947), Engineering News-Record, 25 December 1947, p. 866 (formula from memory, seen restated). */
  it.each([
    [0, 1, 1],
    [0.2, 0.964569, 0.993075],
    [0.4, 0.893784, 0.959758],
    [0.5, 0.845386, 0.927843],
    [0.6, 0.786125, 0.881736],
    [0.7, 0.712331, 0.816185],
    [0.8, 0.616307, 0.721002],
    [0.9, 0.476966, 0.569377],
    [0.95, 0.367094, 0.442562],
  ])('drowned: h2/h1 = %d', (ratio, rectangular, notch) => {
    const flat = level(3);
    const v = crestOf([
      [0, 5],
      [5, 0],
      [10, 5],
    ]);
    const share = (crest: Float64Array) =>
      drowning(crestHead(crest, 2 * ratio), crestHead(crest, 2));
    expect(share(flat)).toBeCloseTo(rectangular, 6);
    expect(share(v)).toBeCloseTo(notch, 6);
  });

  it('is exact over sloping pieces, wet in part or wholly, and however little they slope', () => {
    const numeric = (z: number, length: number, a: number, b: number) => {
      const parts = 200_000;
      let sum = 0;
      for (let k = 0; k < parts; k++) {
        const ground = a + ((b - a) * (k + 0.5)) / parts;
        sum += Math.max(0, z - ground) ** 1.5;
      }
      return (sum * length) / parts;
    };
    for (const [z, length, a, b] of [
      [2, 10, 0, 1],
      [2, 10, 1.5, 3],
      [2, 7, 1.9, 1.87],
      [2, 7, 0.01, 0],
      [2, 7, 2.5, 3],
    ]) {
      expect(pieceHead(z, length, a, b)).toBeCloseTo(numeric(z, length, a, b), 6);
      expect(pieceHead(z, length, b, a)).toBe(pieceHead(z, length, a, b));
    }
  });
});
