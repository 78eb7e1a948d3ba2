import { validateCase } from '../../../shared/case/validateCase';
import { soundCase } from './soundCase';

/** What a sound case says of itself once a part of it was set, to whatever a hand-made file holds. */
function faultsWith(place: 'section' | 'case' | 'numerics', parts: object): string[] {
  const draft = soundCase();
  const target = { section: draft.sections[1], case: draft, numerics: draft.numerics }[place];
  Object.assign(target, parts);
  return validateCase(draft).faults.map(({ path, message }) => `${path}: ${message}`);
}

/** The second section of the sound case: 0 to 30 m, lowest bed 9 m at offset 14, bank marks at 10 and 20 m. */
describe('validation of storage parts and embankments', () => {
  it('lets sound ones through', () => {
    expect(
      faultsWith('section', {
        storage: [
          { from: 0, to: 6 },
          { from: 24, to: 30, flowsAbove: 12 },
        ],
        embankments: { left: { offset: 6, crest: 12.5 }, right: { offset: 20, crest: 11 } },
      }),
    ).toEqual([]);
  });

  it.each<[string, object, string]>([
    [
      'a part without width',
      { storage: [{ from: 6, to: 6 }] },
      'storage[0]: from 6 m does not lie',
    ],
    ['a part beyond the ends', { storage: [{ from: 25, to: 40 }] }, 'reaches beyond the section'],
    [
      'parts that overlap',
      { storage: [{ from: 0, to: 6 }, { from: 5, to: 8 }] }, // prettier-ignore
      'storage[1]: begins at 5 m',
    ],
    ['a part over the bed', { storage: [{ from: 10, to: 20 }] }, 'covers the lowest bed'],
    ['a level that is none', { storage: [{ from: 0, to: 6, flowsAbove: '12' }] }, 'flowsAbove'],
    ['a key that is none', { storage: [{ from: 0, to: 6, depth: 1 }] }, 'is not known here'],
    [
      'an embankment in the channel',
      { embankments: { left: { offset: 12, crest: 13 } } },
      'lies between the bank marks',
    ],
    [
      'a crest below the ground',
      { embankments: { right: { offset: 25, crest: 11 } } },
      'lies below the ground at its offset, 11.60 m',
    ],
    [
      'an embankment outside',
      { embankments: { left: { offset: -1, crest: 14 } } },
      'lies outside the section',
    ],
    ['a crest that is none', { embankments: { left: { offset: 6 } } }, 'crest: is missing'],
  ])('%s', (_, parts, expected) => {
    const faults = faultsWith('section', parts);
    expect(faults).toHaveLength(1);
    expect(faults[0]).toContain('sections[1].');
    expect(faults[0]).toContain(expected);
  });
});

describe('validation of roughness factors, local losses and the momentum coefficient', () => {
  const factor = { from: 0, to: 500, part: 'overbank', depths: [0, 2], factors: [1.5, 1] };
  const loss = { from: 100, to: 900, contraction: 0.1, expansion: 0.3 };

  it('lets sound ones through', () => {
    expect(faultsWith('case', { roughnessFactors: [factor], localLosses: [loss] })).toEqual([]);
    expect(faultsWith('numerics', { momentum: 'compound' })).toEqual([]);
  });

  it.each<[string, object, string]>([
    ['a part that is none', { ...factor, part: 'left' }, 'part: must be one of all, channel'],
    ['depths that fall', { ...factor, depths: [2, 1] }, 'is not beyond the 2 m before it'],
    ['a depth below the bed', { ...factor, depths: [-1, 1] }, 'it cannot be negative'],
    ['a factor too few', { ...factor, factors: [1] }, 'has 1 values for 2 depths'],
    ['a factor of nothing', { ...factor, factors: [0, 1] }, 'factors[0]: is 0; a factor'],
    ['a stretch outside', { ...factor, to: 1500 }, 'lies outside the reach'],
    ['a stretch upside down', { ...factor, from: 500, to: 500 }, 'does not lie above to 500 m'],
  ])('%s', (_, entry, expected) => {
    const faults = faultsWith('case', { roughnessFactors: [entry] });
    expect(faults).toHaveLength(1);
    expect(faults[0]).toContain(expected);
  });

  it.each<[string, object, string]>([
    ['a gain', { ...loss, contraction: -0.1 }, 'contraction: is -0.1'],
    ['more than all', { ...loss, expansion: 1.2 }, 'expansion: is 1.2'],
    ['one that is missing', { from: 0, to: 500, contraction: 0.1 }, 'expansion: is missing'],
  ])('a loss that is %s', (_, entry, expected) => {
    const faults = faultsWith('case', { localLosses: [entry] });
    expect(faults).toHaveLength(1);
    expect(faults[0]).toContain(expected);
  });

  it('a momentum coefficient of no kind', () => {
    expect(faultsWith('numerics', { momentum: 1.1 })[0]).toContain('must be uniform or compound');
  });
});
