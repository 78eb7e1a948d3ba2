import { waterPaths } from '@/components/charts/geometry/waterPaths';

const x = [0, 10, 20, 30, 40];
const bed = [1, 2, 3, 2, 1];
/** 100 px at the datum, 10 px a metre upwards. */
const y = { at0: 100, perMetre: -10 };

test('the line follows the water and the water ends below at the foot', () => {
  const { line, water } = waterPaths({ x, bed, foot: 98 }, y)([5, 5, 4.25, 4, 4]);
  expect(line).toBe('M0,50L10,50L20,57.5L30,60L40,60');
  expect(water).toBe(`${line}L40,98L0,98Z`);
});

test('over dry ground the pen is lifted; water thinner than 2 mm is none', () => {
  const { line, water } = waterPaths({ x, bed, foot: 98 }, y)([1.5, 2.5, 3.001, 2.001, 1.5]);
  expect(line).toBe('M0,85L10,75M40,85');
  expect(water).toBe('M0,85L10,75L10,98L0,98ZM40,85L40,98L40,98Z');
  expect(waterPaths({ x, bed, foot: 98 }, y)(bed)).toEqual({ line: '', water: '' });
});

test('one maker serves any number of frames, each by itself', () => {
  const draw = waterPaths({ x, bed, foot: 98 }, y);
  const first = draw([5, 5, 5, 5, 5]);
  draw([4, 4, 4, 4, 4]);
  expect(draw([5, 5, 5, 5, 5])).toEqual(first);
});
