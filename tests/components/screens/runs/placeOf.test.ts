import { firstLook, isOnReach, placeOf } from '@/components/screens/runs/results/placeOf';
import { summary } from './summary';

test('a station goes before a section, and between places there is no name', () => {
  expect(placeOf(summary(), 700)).toMatchObject({ name: 'Sallow Mill', kind: 'station' });
  expect(placeOf(summary(), 500.004)).toMatchObject({ name: 'XS-02', kind: 'section' });
  expect(placeOf(summary(), 510)).toBeNull();
});

test('an address of another reach is known by its chainage', () => {
  expect(isOnReach(summary(), 0)).toBe(true);
  expect(isOnReach(summary(), 650)).toBe(true);
  expect(isOnReach(summary(), 901)).toBe(false);
  expect(isOnReach(summary(), -1)).toBe(false);
  expect(isOnReach(summary(), null)).toBe(false);
});

test('the first look is at the first station, else the middle section, at its highest water', () => {
  expect(firstLook(summary())).toEqual({ at: 700, t: 63_340 });
  expect(firstLook(summary({ stations: [] }))).toEqual({ at: 500, t: 63_140 });
});
