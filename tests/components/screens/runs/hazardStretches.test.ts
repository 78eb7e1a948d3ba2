import { hazardStretches } from '@/components/screens/runs/results/hazardStretches';

test('neighbours of one class are one stretch that reaches half-way to the next', () => {
  const places = [
    { chainage: 0, hazard: 'H5' as const },
    { chainage: 100, hazard: 'H5' as const },
    { chainage: 300, hazard: 'H6' as const },
    { chainage: 400, hazard: null },
  ];
  expect(hazardStretches(places)).toEqual([
    { from: 0, to: 200, hazard: 'H5' },
    { from: 200, to: 350, hazard: 'H6' },
    { from: 350, to: 400, hazard: null },
  ]);
  expect(hazardStretches([])).toEqual([]);
});
