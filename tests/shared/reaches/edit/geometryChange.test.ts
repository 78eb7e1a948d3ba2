import { applyChange, changeBetween } from '@/shared/reaches/edit/geometryChange';
import { checkGeometry } from '@/shared/reaches/edit/checkGeometry';
import { describeChange } from '@/shared/reaches/edit/describeChange';
import { shiftDatum } from '@/shared/reaches/edit/shiftDatum';
import type { Section } from '@/shared/surveys/types';
import { plainSections } from '../../../helpers/plainSections';

const before = plainSections();
const [one, two, three, four] = before;

test('a change holds what is new or different and names what is gone; made again it gives the same', () => {
  const after = [shiftDatum(one, 0.1), three, { ...four, id: 'Weir' }];
  const change = changeBetween(before, after);
  expect(change.sections.map(({ id }) => id)).toEqual(['XS-01', 'Weir']);
  expect(change.removed).toEqual(['XS-02', 'XS-04']);
  expect(applyChange(before, change)).toEqual(after);
  expect(changeBetween(before, before)).toEqual({ sections: [], removed: [] });
});

test('sections come along the reach again when one was moved', () => {
  const moved = { ...one, chainage: 750 };
  const after = applyChange(before, { sections: [moved], removed: [] });
  expect(after.map(({ id }) => id)).toEqual(['XS-02', 'XS-01', 'XS-03', 'XS-04']);
});

test('the history says what was done to which section', () => {
  const after = [
    { ...shiftDatum(one, 0.1), banks: null },
    { ...two, id: 'Bridge' },
    { ...four, storage: [{ from: 0, to: 10 }] },
    { ...four, id: 'XS-05', chainage: 1600 },
  ];
  expect(describeChange(before, after)).toBe(
    'XS-02 to Bridge: renamed; XS-05: added; XS-03: removed; XS-01: points; XS-01: bank marks; XS-04: storage parts',
  );
  expect(describeChange(before, before)).toBe('Nothing changed');
});

test.each<[string, Partial<Section>, string]>([
  [
    'an offset that goes back',
    {
      points: [
        [0, 5],
        [4, 1],
        [3, 1],
        [9, 5],
      ],
    },
    'points[2][0]',
  ],
  [
    'an elevation that is no number',
    {
      points: [
        [0, 5],
        [4, NaN],
        [9, 5],
      ],
    },
    'points[1][1]',
  ],
  [
    'two points',
    {
      points: [
        [0, 5],
        [4, 1],
      ],
    },
    'points',
  ],
  [
    'no width',
    {
      points: [
        [4, 5],
        [4, 3],
        [4, 5],
      ],
    },
    'points',
  ],
  [
    'a wall that falls outwards',
    {
      points: [
        [0, 1],
        [0, 5],
        [9, 5],
      ],
    },
    'points[0][1]',
  ],
  ['a bank beyond the end', { banks: [-1, 30] }, 'banks[0]'],
  ['banks the wrong way round', { banks: [38, 20] }, 'banks[1]'],
  [
    'a zone beyond the end',
    {
      roughness: [
        [0, 0.04],
        [58, 0.05],
      ],
    },
    'roughness[1][0]',
  ],
  ['storage that ends before it begins', { storage: [{ from: 10, to: 5 }] }, 'storage[0].to'],
  ['storage over everything', { storage: [{ from: 0, to: 58 }] }, 'storage[0].to'],
  [
    'an embankment on the end',
    { embankments: { left: { offset: 0, crest: 17 } } },
    'embankments.left.offset',
  ],
  [
    'embankments the wrong way round',
    { embankments: { left: { offset: 40, crest: 14 }, right: { offset: 10, crest: 14 } } },
    'embankments.right.offset',
  ],
  ['no name', { id: ' ' }, 'id'],
  ['the chainage of another', { chainage: 500 }, 'chainage'],
  ['the name of another', { id: 'XS-02' }, 'id'],
])('%s is a fault at its place', (_what, change, path) => {
  const faults = checkGeometry([{ ...one, ...change }, two, three]);
  expect(faults.map((fault) => fault.path)).toContain(path);
});

test('a geometry without fault has none', () => {
  expect(checkGeometry(before)).toEqual([]);
  expect(checkGeometry([one])).toHaveLength(1);
});
