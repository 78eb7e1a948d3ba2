import { nearestSection } from '@/components/screens/reach/nearestSection';
import {
  allSections,
  describeChoice,
  sectionsBetween,
  toggleSection,
} from '@/components/screens/reach/sectionChoice';

const sections = [0, 480, 960, 1440].map((chainage, index) => ({
  id: `XS-${index + 1}`,
  chainage,
}));

describe('choosing sections', () => {
  it('keeps the order of the reach whatever is ticked first', () => {
    const two = toggleSection(toggleSection([], sections, 'XS-3'), sections, 'XS-1');
    expect(two).toEqual(['XS-1', 'XS-3']);
    expect(toggleSection(two, sections, 'XS-1')).toEqual(['XS-3']);
  });

  it('takes a stretch from either end, its ends included', () => {
    expect(sectionsBetween(sections, 480, 1440)).toEqual(['XS-2', 'XS-3', 'XS-4']);
    expect(sectionsBetween(sections, 1440, 480)).toEqual(['XS-2', 'XS-3', 'XS-4']);
    expect(sectionsBetween(sections, 481, 959)).toEqual([]);
  });

  it('says what is chosen', () => {
    expect(describeChoice([])).toBe('No section');
    expect(describeChoice(['XS-1'])).toBe('XS-1');
    expect(describeChoice(allSections(sections))).toBe('4 sections, XS-1 to XS-4');
  });

  it('finds the section nearest to a place', () => {
    expect(nearestSection(sections, 700)?.id).toBe('XS-2');
    expect(nearestSection(sections, 1e6)?.id).toBe('XS-4');
    expect(nearestSection([], 0)).toBeNull();
  });
});
