import { adviseReach } from '../../../server/services/reaches/advice/adviseReach';
import { describeSection } from '../../../server/services/reaches/describeSection';
import type { Section } from '../../../shared/surveys/types';
import { plainSections } from '../../helpers/plainSections';

const advise = (sections: Section[]) => adviseReach(sections.map(describeSection));
const codes = (sections: Section[]) =>
  advise(sections).map(({ code, sectionIds }) => `${code} ${sectionIds.join(' ')}`);
const edited = (change: (section: Section, i: number) => Section) =>
  plainSections(4, 400).map(change);
const lifted = (section: Section, by: number): Section => ({
  ...section,
  points: section.points.map(([y, z]) => [y, z + by]),
});

test('a sound reach gets none', () => expect(codes(plainSections(4, 350))).toEqual([]));

describe('spacing', () => {
  // Samuels (1989, 1990), 0.15 D/S, numbers from memory: a depth of 3 m on a slope of 0.001 allows 450 m.
  test('0.15 D/S on a gentle river', () => {
    expect(codes(plainSections(3, 340))).toEqual([]);
    const [advice] = advise(plainSections(3, 460).map((section) => widened(section, 4)));
    expect(advice.code).toBe('spacing');
    expect(advice.message).toMatch(/lie 460 m apart; 4\d\d m or less/);
    expect(advice.source).toMatch(/Samuels/);
  });
  test('twenty channel widths', () => {
    const [advice] = advise(plainSections(3, 380));
    expect(advice.reason).toMatch(/^20 bank-full widths of 18 m are 360 m/);
  });
  const widened = (section: Section, by: number): Section => ({
    ...section,
    points: section.points.map(([y, z]) => [y * by, z]),
    banks: [section.banks![0] * by, section.banks![1] * by],
    roughness: section.roughness.map(([y, n]) => [y * by, n]),
  });
});

test('a bed that rises', () => {
  const sections = plainSections(4, 350).map((section, i) =>
    i === 2 ? lifted(section, 1) : section,
  );
  const [advice] = advise(sections);
  expect(advice).toMatchObject({
    code: 'adverseSlope',
    sectionIds: ['XS-02', 'XS-03'],
    chainage: 525,
  });
  expect(advice.message).toBe('The bed rises 0.65 m from XS-02 to XS-03.');
});

test('a jump of conveyance', () => {
  // Davidian (1984), USGS TWRI 3-A15: ratios within 0.7 to 1.4; the numbers from memory.
  const rougher = (n: number) =>
    plainSections(3, 350).map((section, i) =>
      i === 1 ? { ...section, roughness: [[0, n]] as [number, number][] } : section,
    );
  expect(codes(rougher(0.035 * 1.35))).toEqual([]);
  expect(codes(rougher(0.035 * 1.5))).toEqual([
    'conveyanceJump XS-01 XS-02',
    'conveyanceJump XS-02 XS-03',
  ]);
});

test('missing banks are one matter', () => {
  const [advice] = advise(edited((section) => ({ ...section, banks: null })));
  expect(advice).toMatchObject({
    code: 'noBanks',
    sectionIds: ['XS-01', 'XS-02', 'XS-03', 'XS-04'],
  });
  expect(advice.message).toBe('XS-01, XS-02, XS-03 and 1 more have no bank marks.');
});

test('roughness that is missing, or outside of the published table', () => {
  expect(codes(plainSections(3, 350).map((section) => ({ ...section, roughness: [] })))).toEqual([
    'roughnessRange XS-01 XS-02 XS-03',
  ]);
  const [, odd] = plainSections(3, 350);
  odd.roughness = [
    [0, 0.3],
    [20, 0.035],
    [38, 0.06],
  ];
  const sections = plainSections(3, 350).with(1, odd);
  expect(codes(sections)).toEqual(['roughnessRange XS-02']);
});

test('an end lower than its bank', () => {
  const [section] = plainSections(1);
  const low: Section = { ...section, points: section.points.with(-1, [58, 12.5]) };
  const sections = [low, ...plainSections(3, 350).slice(1)];
  const [advice] = advise(sections).filter(({ code }) => code === 'lowEnds');
  expect(advice.message).toBe('XS-01 ends below its bank: right end 12.50 m, bank 13.00 m.');
});
