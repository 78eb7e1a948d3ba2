import { firstAbove, timeAbove } from '@/shared/runs/crossings';

// A triangle by hand: 0 at 0 s, 2 at 100 s, 0 at 300 s.
const times = [0, 100, 300];
const values = [0, 2, 0];

test('the first time above a level, between the moments', () => {
  expect(firstAbove(times, values, 0.5)).toBe(25);
  expect(firstAbove(times, values, 1.5)).toBe(75);
  expect(firstAbove(times, values, 2)).toBeNull();
  expect(firstAbove(times, values, -1)).toBe(0);
  expect(firstAbove([], [], 1)).toBeNull();
});

test('how long it stays above, rising and falling', () => {
  // From 50 s to 200 s.
  expect(timeAbove(times, values, 1)).toBe(150);
  expect(timeAbove(times, values, 2)).toBe(0);
  expect(timeAbove(times, values, -1)).toBe(300);
  expect(timeAbove([0, 10], [5, 5], 4)).toBe(10);
});
