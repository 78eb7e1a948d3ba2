import { geometryDraft, startDraft } from '@/components/screens/reach/edit/geometryDraft';
import { plainSections } from '@/tests/helpers/plainSections';

const [a, b, c, d] = plainSections();
const start = startDraft([a, b, c]);
const put = (draft: typeof start, sections: (typeof a)[], words: string, gesture?: string) =>
  geometryDraft(draft, { type: 'changed', sections, words, gesture });

describe('what was done to a geometry', () => {
  it('is taken back and done again, step by step', () => {
    const done = put(put(start, [a, b], 'one out'), [a, b, d], 'one in');
    const back = geometryDraft(done, { type: 'undone' });
    expect(back.sections).toEqual([a, b]);
    expect(geometryDraft(back, { type: 'undone' }).sections).toEqual([a, b, c]);
    expect(geometryDraft(back, { type: 'redone' }).sections).toEqual([a, b, d]);
    expect(geometryDraft(start, { type: 'undone' })).toBe(start);
    expect(geometryDraft(start, { type: 'redone' })).toBe(start);
  });

  it('of one gesture is one step, with its last words', () => {
    const dragged = put(
      put(put(start, [a, b], 'x', 'drag 1'), [a], 'y', 'drag 1'),
      [b],
      'z',
      'drag 1',
    );
    expect(dragged.done.map(({ words }) => words)).toEqual(['z']);
    expect(geometryDraft(dragged, { type: 'undone' }).sections).toEqual([a, b, c]);
    expect(put(dragged, [c], 'w', 'drag 2').done).toHaveLength(2);
  });

  it('cannot be done again once something else was done', () => {
    const back = geometryDraft(put(start, [a], 'one'), { type: 'undone' });
    expect(put(back, [b], 'other').undone).toEqual([]);
  });
});
