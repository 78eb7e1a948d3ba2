import { QueryClientProvider } from '@tanstack/react-query';
import { act, renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createQueryClient } from '@/components/queries/queryClient';
import { keptDraft } from '@/components/screens/scenarios/draftStore';
import { useScenarioEditor } from '@/components/screens/scenarios/useScenarioEditor';
import { whyNotRouted } from '@/components/screens/scenarios/whyNotRouted';
import type { Reach } from '@/shared/reaches/types';
import { newScenario, proposals } from '@/shared/scenarios/proposals';
import type { Scenario } from '@/shared/scenarios/types';
import { plainSections } from '@/tests/helpers/plainSections';

const sections = plainSections(5);
const reach = { id: 4, sections } as unknown as Reach;
const stored = (version: number, name = 'Design flood'): Scenario => ({
  id: 7,
  studyId: 1,
  name,
  reachId: 4,
  peakInflow: null,
  faultCount: 3,
  runCount: 0,
  version,
  updatedAt: '2026-11-14T06:00:00.000Z',
  updatedBy: 'Ines Corrow',
  body: newScenario(name, 4, sections),
  faults: [],
  doubts: [],
  proposals: proposals(sections),
});

let sent: { version: number; body: Scenario['body'] }[];
/** A server that has the given version, and refuses what began from another. */
function server(current: number) {
  sent = [];
  global.fetch = jest.fn(async (_path: RequestInfo | URL, options?: RequestInit) => {
    const change = JSON.parse(String(options?.body));
    sent.push(change);
    const fits = change.version === current;
    return {
      ok: fits,
      status: fits ? 200 : 409,
      json: async () =>
        fits
          ? { ...stored(current + 1), body: change.body }
          : { error: { code: 'conflict', message: 'Somebody else saved it.' } },
    } as Response;
  });
}

function edit(scenario: Scenario) {
  const client = createQueryClient();
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  );
  return renderHook(({ of }) => useScenarioEditor(of, reach), {
    wrapper,
    initialProps: { of: scenario },
  });
}

const flood = { peakFlow: 100, baseFlow: 10, timeToPeak: 7200 };

describe('editing a scenario', () => {
  beforeEach(() => sessionStorage.clear());

  it('says what is missing, and lets it be routed once that is given and saved', async () => {
    server(1);
    const { result } = edit(stored(1));
    expect(result.current.faults.map(({ path }) => path)).toEqual([
      'upstream.baseFlow',
      'upstream.peakFlow',
      'upstream.timeToPeak',
    ]);
    expect(whyNotRouted(result.current, true)).toBe('3 things to mend.');
    expect(result.current.isDirty).toBe(false);

    act(() => result.current.dispatch({ type: 'upstreamChanged', change: flood }));
    expect(result.current.faults).toEqual([]);
    expect(whyNotRouted(result.current, true)).toBe('Save it first.');

    act(() => result.current.save());
    await waitFor(() => expect(result.current.isDirty).toBe(false));
    expect(sent[0]).toMatchObject({ version: 1, body: { upstream: flood } });
    expect(whyNotRouted(result.current, true)).toBeNull();
    expect(whyNotRouted(result.current, false)).toBe('The reach is being read.');
  });

  it('keeps what was typed for the tab, and brings it back', () => {
    const first = edit(stored(1));
    act(() => first.result.current.dispatch({ type: 'upstreamChanged', change: flood }));
    first.unmount();
    expect(keptDraft(7)?.version).toBe(1);

    const second = edit(stored(1));
    expect(second.result.current.wasKept).toBe(true);
    expect(second.result.current.draft.upstream.byKind.generated).toMatchObject(flood);
    act(() => second.result.current.throwAway());
    expect(second.result.current.isDirty).toBe(false);
    expect(keptDraft(7)).toBeNull();
  });

  it('asks before the tab is closed only while something is not saved', () => {
    const { result } = edit(stored(1));
    const close = () => {
      const event = new Event('beforeunload', { cancelable: true });
      window.dispatchEvent(event);
      return event.defaultPrevented;
    };
    expect(close()).toBe(false);
    act(() => result.current.dispatch({ type: 'detailsChanged', change: { note: 'x' } }));
    expect(close()).toBe(true);
  });

  it('follows what somebody else saved while nothing was typed here', () => {
    const { result, rerender } = edit(stored(1));
    rerender({ of: stored(2, 'Renamed') });
    expect(result.current.draft.name).toBe('Renamed');
    expect(result.current.isBehind).toBe(false);
  });

  it('keeps what was typed over what somebody else saved, and saves over it when asked to', async () => {
    server(2);
    const { result, rerender } = edit(stored(1));
    act(() => result.current.dispatch({ type: 'detailsChanged', change: { name: 'Mine' } }));
    act(() => result.current.save());
    await waitFor(() => expect(result.current.isBehind).toBe(true));
    expect(result.current.saveError).toBeNull();

    rerender({ of: stored(2, 'Theirs') });
    expect(result.current.draft.name).toBe('Mine');
    act(() => result.current.saveOver());
    await waitFor(() => expect(result.current.isBehind).toBe(false));
    expect(sent.map(({ version }) => version)).toEqual([1, 2]);
    expect(result.current.isDirty).toBe(false);
  });

  it('does not save a number or a clock that cannot be read', () => {
    const { result } = edit(stored(1));
    act(() => result.current.dispatch({ type: 'upstreamChanged', change: { peakFlow: NaN } }));
    expect(result.current.unsavable).toBe('A number cannot be read.');
    expect(result.current.isDirty).toBe(true);
    act(() => result.current.dispatch({ type: 'upstreamChanged', change: flood }));
    act(() => result.current.dispatch({ type: 'detailsChanged', change: { startsAt: '31 June' } }));
    expect(result.current.unsavable).toContain('2026-11-14');
    expect(result.current.faults[0].path).toBe('startsAt');
  });
});
