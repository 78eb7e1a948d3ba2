import { hazardClass, worstHazard } from '@/shared/hazard/hazardClass';

/** Points on and just over the limits of AIDR Guideline 7-3 (2017); classes worked out by hand from its table. */
const POINTS: [depth: number, velocity: number, label: string][] = [
  [0.1, 1.0, 'H1'],
  [0.25, 1.0, 'H1'],
  [0.3, 1.0, 'H1'],
  [0.3, 1.001, 'H2'],
  [0.31, 0.2, 'H2'],
  [0.5, 0.0, 'H2'],
  [0.5, 1.2, 'H2'],
  [0.5, 1.21, 'H4'],
  [0.51, 0.5, 'H3'],
  [1.2, 0.5, 'H3'],
  [1.2, 0.51, 'H4'],
  [1.21, 0.1, 'H4'],
  [2.0, 0.5, 'H4'],
  [2.0, 0.51, 'H5'],
  [2.01, 0.1, 'H5'],
  [0.1, 2.0, 'H1'],
  [0.1, 2.01, 'H5'],
  [1.0, 4.0, 'H5'],
  [1.0, 4.01, 'H6'],
  [4.0, 1.0, 'H5'],
  [4.01, 0.1, 'H6'],
  [0.2, 2.5, 'H5'],
];

it.each(POINTS)('%f m at %f m/s is %s', (depth, velocity, label) => {
  expect(hazardClass(depth, velocity)?.label).toBe(label);
  expect(hazardClass(depth, -velocity)?.label).toBe(label);
});

it('has no class where it is dry', () => {
  expect(hazardClass(0, 0)).toBeNull();
  expect(worstHazard([0, 0], [0, 0])).toBeNull();
});

it('takes the worst moment, not the worst depth with the worst velocity', () => {
  expect(worstHazard([0, 0.25, 1.1], [0, 1.9, 0.1])?.label).toBe('H3');
  expect(hazardClass(1.1, 1.9)?.label).toBe('H5');
});
