import { readRunIds, toggled } from '@/components/screens/compare/runIds';

test('the address says which runs; what cannot be one is left out, and four are enough', () => {
  expect(readRunIds('3,5')).toEqual([3, 5]);
  expect(readRunIds('3,x,-1,3,2.5,,7')).toEqual([3, 7]);
  expect(readRunIds('1,2,3,4,5')).toEqual([1, 2, 3, 4]);
  expect(readRunIds(undefined)).toEqual([]);
});

test('a run is added at the end and taken out where it stands', () => {
  expect(toggled([3, 5], 7)).toEqual([3, 5, 7]);
  expect(toggled([3, 5], 3)).toEqual([5]);
});
