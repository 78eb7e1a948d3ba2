import { QueryClientProvider } from '@tanstack/react-query';
import { act, renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createQueryClient } from '@/components/queries/queryClient';
import { keptGeometry } from '@/components/screens/reach/edit/geometryDraftStore';
import { useGeometryEditor } from '@/components/screens/reach/edit/useGeometryEditor';
import { shiftDatum } from '@/shared/reaches/edit/shiftDatum';
import { applyChange } from '@/shared/reaches/edit/geometryChange';
import type { GeometryChangeBody } from '@/shared/reaches/schemas';
import type { Reach } from '@/shared/reaches/types';
import type { Section } from '@/shared/surveys/types';
import { plainSections } from '@/tests/helpers/plainSections';

const sections = plainSections();
const stored = (version: number, of: Section[] = sections) =>
  ({ id: 9, studyId: 1, name: 'Dredged', version, sections: of }) as unknown as Reach;

let sent: GeometryChangeBody[];
/** A server that has the given version, and refuses what began from another. */
function server(current: number, has: Section[] = sections) {
  sent = [];
  global.fetch = jest.fn(async (_path: RequestInfo | URL, options?: RequestInit) => {
    const change = JSON.parse(String(options?.body)) as GeometryChangeBody;
    sent.push(change);
    const fits = change.version === current;
    return {
      ok: fits,
      status: fits ? 200 : 409,
      json: async () =>
        fits
          ? stored(current + 1, applyChange(has, change))
          : { error: { code: 'conflict', message: 'Somebody else changed it.' } },
    } as Response;
  });
}

function edit(reach: Reach) {
  const client = createQueryClient();
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  );
  return renderHook(({ of }) => useGeometryEditor(of), { wrapper, initialProps: { of: reach } });
}

const raise = (section: Section) => shiftDatum(section, 0.5);

describe('editing a geometry', () => {
  beforeEach(() => sessionStorage.clear());

  it('sends only what is different, and still takes it back after saving', async () => {
    server(1);
    const { result } = edit(stored(1));
    expect(result.current.isDirty).toBe(false);
    act(() => result.current.changeSection('XS-02', raise(sections[1]), 'XS-02: raised'));
    expect(result.current.isDirty).toBe(true);
    act(() => result.current.save());
    await waitFor(() => expect(result.current.isDirty).toBe(false));
    expect(sent[0].sections.map(({ id }) => id)).toEqual(['XS-02']);
    expect(sent[0]).toMatchObject({ version: 1, removed: [], steps: ['XS-02: raised'] });
    act(() => result.current.undo());
    expect(result.current.isDirty).toBe(true);
    expect(result.current.sections[1].points).toEqual(sections[1].points);
  });

  it('does not save what has a fault, nor a number that cannot be read', () => {
    const { result } = edit(stored(1));
    act(() => result.current.changeSection('XS-01', { ...sections[0], banks: [40, 20] }, 'banks'));
    expect(result.current.unsavable).toBe('One fault to mend.');
    act(() => result.current.undo());
    act(() => result.current.unread.set({ sectionId: 'XS-01', row: 2, column: 1 }, 'x'));
    expect(result.current.unsavable).toBe('A number cannot be read.');
  });

  it('keeps what is not saved for the tab, and shows it again', () => {
    const first = edit(stored(1));
    act(() => first.result.current.changeSection('XS-02', raise(sections[1]), 'XS-02: raised'));
    first.unmount();
    expect(keptGeometry(9)).toMatchObject({ version: 1, steps: ['XS-02: raised'] });
    const again = edit(stored(1)).result;
    expect(again.current.wasKept).toBe(true);
    expect(again.current.sections[1].points[0][1]).toBe(16);
    act(() => again.current.throwAway());
    expect(again.current.isDirty).toBe(false);
    expect(keptGeometry(9)).toBeNull();
  });

  it('that somebody else has saved meanwhile asks, and saves its own sections over theirs', async () => {
    const theirs = sections.map((section, i) => (i === 3 ? raise(section) : section));
    server(2, theirs);
    const { result, rerender } = edit(stored(1));
    act(() => result.current.changeSection('XS-02', raise(sections[1]), 'XS-02: raised'));
    act(() => result.current.save());
    await waitFor(() => expect(result.current.isBehind).toBe(true));
    rerender({ of: stored(2, theirs) });
    expect(result.current.isDirty).toBe(true);
    act(() => result.current.saveOver());
    await waitFor(() => expect(result.current.isDirty).toBe(false));
    expect(result.current.sections[3].points[0][1]).toBe(15);
    expect(result.current.canUndo).toBeNull();
    expect(sent[sent.length - 1].version).toBe(2);
    expect(sent[sent.length - 1].sections.map(({ id }) => id)).toEqual(['XS-02']);
  });

  it('shows what somebody else saved where nothing was changed here', () => {
    const { result, rerender } = edit(stored(1));
    rerender({ of: stored(2, sections.slice(0, 3)) });
    expect(result.current.sections).toHaveLength(3);
    expect(result.current.isDirty).toBe(false);
  });
});
