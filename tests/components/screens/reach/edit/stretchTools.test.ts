import { tryTool } from '@/components/screens/reach/edit/stretchTools';
import { plainSections } from '@/tests/helpers/plainSections';

const sections = plainSections();
const all = sections.map(({ id }) => id);

describe('an operation over a stretch says beforehand what it comes to', () => {
  it('for sections in between', () => {
    const outcome = tryTool('fill', sections, all, 250)!;
    expect(outcome.words).toBe('3 sections more');
    expect(outcome.sections).toHaveLength(7);
    expect(tryTool('fill', sections, all, 600)!.words).toBe('No gap is wider than that.');
    expect(() => tryTool('fill', sections, ['XS-01'], 100)).toThrow(/two sections or more/);
    expect(() => tryTool('fill', sections, all, -1)).toThrow(/above 0/);
    expect(tryTool('fill', sections, all, null)).toBeNull();
  });

  it('for thinning, with the area that each section loses', () => {
    const outcome = tryTool('thin', sections, ['XS-02'], 2)!;
    expect(outcome.cost!.map(({ id }) => id)).toEqual(['XS-02']);
    expect(outcome.sections[0]).toBe(sections[0]);
    expect(outcome.words).toMatch(/points fewer in 1 section$/);
    expect(tryTool('thin', sections, all, 0.001)!.words).toBe(
      'No point can be left out at that tolerance.',
    );
  });

  it('for a shift, left and right, and bank marks', () => {
    expect(tryTool('shift', sections, all, 0.5)!.sections[3].points[0][1]).toBe(15);
    expect(tryTool('shift', sections, all, 0)).toBeNull();
    expect(tryTool('turn', sections, all, null)!.words).toBe('4 sections');
    const bare = sections.map((section) => ({ ...section, banks: null }));
    const marked = tryTool('banks', bare, all, null)!;
    expect(marked.words).toBe('Marks for 4 of 4 sections; the others stay as they are');
    expect(marked.sections[2].banks).toEqual([20, 38]);
    expect(tryTool('turn', sections, [], null)).toBeNull();
  });
});
