import type { Section } from '../../shared/surveys/types';

/** Ground of one section at chainage 0: [offset, elevation], with banks at 22 and 41 m. Invented. */
const GROUND: [number, number][] = [
  [0, 14.9],
  [8, 13.6],
  [16, 12.9],
  [22, 12.7],
  [25.5, 10.4],
  [29, 9.35],
  [33.5, 9.1],
  [37, 9.9],
  [41, 12.6],
  [52, 12.8],
  [64, 13.5],
  [73, 15.1],
];
const BANKS: [number, number] = [22, 41];
const SPACING = 180;
const SLOPE = 0.0012;
/** How each section differs from the first: wider and shallower, or narrower and deeper. */
const WIDENING = [1, 1.08, 0.94, 1.03];

/** A short reach to show how the workbook is filled in. */
export function exampleSections(): Section[] {
  return WIDENING.map((wider, i) => {
    const chainage = i * SPACING;
    const offset = (y: number) => round(y * wider, 10);
    const points = GROUND.map(([y, z]): [number, number] => [
      offset(y),
      round(z - SLOPE * chainage + (1 - wider) * (y > BANKS[0] && y < BANKS[1] ? 2 : 0.5), 100),
    ]);
    const banks: [number, number] = [offset(BANKS[0]), offset(BANKS[1])];
    return {
      id: `XS-0${i + 1}`,
      chainage,
      points,
      roughness: [
        [0, 0.055],
        [banks[0], 0.035],
        [banks[1], 0.05],
      ],
      banks,
      coordinates: points.map(([y]) => [round(4200 + chainage, 10), round(7400 - y, 10)]),
    };
  });
}

const round = (value: number, steps: number) => Math.round(value * steps) / steps;
