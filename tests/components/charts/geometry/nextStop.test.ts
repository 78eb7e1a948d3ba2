import { nextStop } from '@/components/charts/geometry/nextStop';

const stops = [0, 500, 900, 1500, 2100, 2700, 3300, 4000];

test.each([
  ['ArrowRight', 900, 1500],
  ['ArrowUp', 900, 1500],
  ['ArrowLeft', 900, 500],
  ['ArrowDown', 900, 500],
  ['PageUp', 500, 3300],
  ['PageDown', 4000, 900],
  ['Home', 2100, 0],
  ['End', 2100, 4000],
  ['ArrowLeft', 0, 0],
  ['ArrowRight', 4000, 4000],
])('%s at %d leads to %d', (key, at, to) => {
  expect(nextStop(stops, at, key)).toBe(to);
});

test('from between two stops a step leads to the neighbour, not past it', () => {
  expect(nextStop(stops, 700, 'ArrowRight')).toBe(900);
  expect(nextStop(stops, 800, 'ArrowRight')).toBe(900);
  expect(nextStop(stops, 600, 'ArrowLeft')).toBe(500);
  expect(nextStop(stops, 800, 'ArrowLeft')).toBe(500);
});

test('other keys are left to the page', () => {
  expect(nextStop(stops, 900, 'Tab')).toBeNull();
  expect(nextStop([], 900, 'Home')).toBeNull();
});
