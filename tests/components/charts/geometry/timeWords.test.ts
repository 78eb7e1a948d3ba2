import { momentWords, shortTime, timeWords } from '@/components/charts/geometry/timeWords';

test('a flood of days is told in hours, a dam break in minutes or seconds', () => {
  expect(shortTime(22.5 * 3600, 172_800)).toBe('22 h 30');
  expect(shortTime(754, 3600)).toBe('12 min 34');
  expect(shortTime(42, 240)).toBe('42 s');
  expect(shortTime(4.26, 20)).toBe('4.3 s');
});

test('with the clock where the study has a start', () => {
  expect(timeWords(18 * 3600, 172_800, '2024-11-14T06:00:00Z')).toBe('18 h 00, 15 Nov, 00:00');
  expect(timeWords(18 * 3600, 172_800, null)).toBe('18 h 00');
  expect(momentWords(18 * 3600, 172_800, null)).toBe('18 h 00 after start');
});

test('hours from start and the clock are rounded alike', () => {
  expect(momentWords(59_619, 172_800, '2024-11-14T00:00:00Z')).toBe(
    '16 h 34 after start, 14 Nov, 16:34',
  );
});
