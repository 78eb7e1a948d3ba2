import { stationDifferences } from '@/shared/studies/stationDifferences';
import type { Station } from '@/shared/studies/types';

const bridge: Station = {
  id: 1,
  name: 'Mill bridge',
  chainage: 1000,
  levels: [{ kind: 'soffit', level: 52.4, note: '' }],
};
const quay: Station = { id: 2, name: 'Ferrin quay', chainage: 1700, levels: [] };

test('the same stations in another order, with levels that were left out, are the same', () => {
  const bare: Station = { id: 2, name: 'Ferrin quay', chainage: 1700 };
  expect(stationDifferences([bridge, bare], [quay, bridge])).toEqual([]);
});

test('each that is otherwise is named as it was, with what is otherwise', () => {
  const today: Station[] = [
    { ...bridge, levels: [{ kind: 'soffit', level: 52.5, note: '' }] },
    { id: 9, name: 'School', chainage: 300, levels: [] },
  ];
  expect(stationDifferences([bridge, quay], today)).toEqual([
    { name: 'Mill bridge', what: 'levels' },
    { name: 'Ferrin quay', what: 'gone' },
    { name: 'School', what: 'added' },
  ]);
  expect(stationDifferences([quay], [{ ...quay, chainage: 1710 }])[0].what).toBe('moved');
  expect(stationDifferences([quay], [{ ...quay, name: 'Quay' }])[0].what).toBe('renamed');
});
