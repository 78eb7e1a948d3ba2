import { compareGeometries } from '@/shared/reaches/compare/compareGeometries';
import { movePoint } from '@/shared/reaches/edit/movePoint';
import { plainSections } from '../../../helpers/plainSections';

const before = plainSections();
const [one, two, three, four] = before;

test('every section is told what became of it, along the reach', () => {
  const scoured = movePoint(movePoint(one, 3, [26, 9.5]), 4, [32, 9.5]);
  const rows = compareGeometries(before, [
    scoured,
    { ...two, chainage: 620 },
    { ...four, id: 'Weir' },
    { ...four, id: 'New', chainage: 1700 },
  ]);
  expect(rows.map(({ fate, before: b, after: a }) => [fate, b?.id, a?.id])).toEqual([
    ['changed', 'XS-01', 'XS-01'],
    ['moved', 'XS-02', 'XS-02'],
    ['removed', 'XS-03', undefined],
    ['renamed', 'XS-04', 'Weir'],
    ['added', undefined, 'New'],
  ]);
  expect(rows[0].changes).toEqual(['points']);
});

test('a bed dug 0.5 m deeper: area below the bank and lowest point by hand', () => {
  const [row] = compareGeometries(
    [one, two],
    [movePoint(movePoint(one, 3, [26, 9.5]), 4, [32, 9.5]), two],
  );
  // Bank level 13. Before: 6·3 + 2·(6·3/2) = 36 m²; after: 6·3.5 + 2·(6·3.5/2) = 42 m².
  expect(row.level).toBe(13);
  expect(row.areaBefore).toBeCloseTo(36, 12);
  expect(row.areaChange).toBeCloseTo(6, 12);
  expect(row.thalwegChange).toBeCloseTo(-0.5, 12);
});

test('the same geometry is the same everywhere', () => {
  const rows = compareGeometries(before, plainSections());
  expect(rows.map(({ fate }) => fate)).toEqual(['same', 'same', 'same', 'same']);
  expect(rows.map(({ areaChange }) => areaChange)).toEqual([0, 0, 0, 0]);
  expect(compareGeometries([three], [])[0].fate).toBe('removed');
});
