import { placeName, placesAlong } from '@/components/charts/geometry/placesAlong';

const sections = [
  { id: 'XS-01', chainage: 0 },
  { id: 'XS-02', chainage: 500 },
  { id: 'XS-03', chainage: 900 },
];

test('stations stand among the sections by chainage; one on a section takes its place', () => {
  const places = placesAlong(sections, [
    { name: 'Mill', chainage: 700 },
    { name: 'Bridge', chainage: 500 },
    { name: 'Far away', chainage: 5000 },
  ]);
  expect(places.map(({ name }) => name)).toEqual(['XS-01', 'Bridge', 'Mill', 'XS-03']);
  expect(placeName(places, 700.001)).toBe('Mill');
  expect(placeName(places, 710)).toBeNull();
});

test('no sections, no places', () => {
  expect(placesAlong([], [{ name: 'Mill', chainage: 700 }])).toEqual([]);
});
