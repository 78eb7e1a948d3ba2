import type { SectionInput } from '../../../shared/case/caseFile';

/** Sections that the unit tests share. */

export function rectangle(width: number, height = 10, n = 0.03): SectionInput {
  return {
    id: 'rectangle',
    chainage: 0,
    points: [
      [0, height],
      [0, 0],
      [width, 0],
      [width, height],
    ],
    roughness: [[0, n]],
  };
}

/** Bottom width b, side slope 1 : z (vertical : horizontal). */
export function trapezoid(b: number, z: number, n = 0.025, height = 10): SectionInput {
  const run = z * height;
  return {
    id: 'trapezoid',
    chainage: 0,
    points:
      b > 0
        ? [
            [0, height],
            [run, 0],
            [run + b, 0],
            [2 * run + b, height],
          ]
        : [
            [0, height],
            [run, 0],
            [2 * run, height],
          ],
    roughness: [[0, n]],
  };
}

/** Channel 20 m wide between 3 m walls, and two flat flood plains of 100 m between outer walls. */
export function compound(): SectionInput {
  return {
    id: 'compound',
    chainage: 0,
    points: [
      [0, 10],
      [0, 3],
      [100, 3],
      [100, 0],
      [120, 0],
      [120, 3],
      [220, 3],
      [220, 10],
    ],
    roughness: [
      [0, 0.06],
      [100, 0.03],
      [120, 0.06],
    ],
    banks: [100, 120],
  };
}

/** A natural section with banks, at a chainage. */
export function natural(id: string, chainage: number, bed: number, shift = 0): SectionInput {
  return {
    id,
    chainage,
    points: [
      [0, bed + 7],
      [12 + shift, bed + 4.1],
      [60, bed + 3.2],
      [64, bed + 1.1],
      [72 + shift, bed],
      [80, bed + 0.4],
      [88, bed + 2.9],
      [140 + shift, bed + 3.6],
      [160, bed + 7],
    ],
    roughness: [
      [0, 0.07],
      [60, 0.035],
      [88, 0.06],
    ],
    banks: [60, 88],
  };
}
