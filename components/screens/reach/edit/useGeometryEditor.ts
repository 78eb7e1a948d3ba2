import { useEffect, useMemo, useReducer, useState } from 'react';
import { isApiError } from '@/components/queries/ApiError';
import { useSaveGeometry } from '@/components/queries/geometries';
import { checkGeometry } from '@/shared/reaches/edit/checkGeometry';
import { applyChange, changeBetween, plain } from '@/shared/reaches/edit/geometryChange';
import type { Reach } from '@/shared/reaches/types';
import type { Section } from '@/shared/surveys/types';
import { geometryDraft, startDraft } from './geometryDraft';
import { dropGeometry, keepGeometry, keptGeometry } from './geometryDraftStore';
import { useUnread } from './useUnread';

/** What the draft is compared with: the sections as they were stored, and their version. */
interface Base {
  version: number;
  sections: readonly Section[];
  /** Steps of the draft that the history has been told. */
  told: number;
}

/** A working geometry while it is edited: its sections, what is wrong with them, and whether they are saved. */
export function useGeometryEditor(reach: Reach) {
  const [kept, setKept] = useState(() => keptGeometry(reach.id));
  const [base, setBase] = useState<Base>(() => ({
    ...baseOf(reach),
    version: kept?.version ?? reach.version,
  }));
  const [draft, dispatch] = useReducer(geometryDraft, null, () =>
    startDraft(kept ? applyChange(base.sections, kept.change) : base.sections),
  );
  // Steps of a draft that was kept over a reload can be told, but no longer taken back.
  const [earlier, setEarlier] = useState<string[]>(kept?.steps ?? []);
  const save = useSaveGeometry(reach.id);
  const unread = useUnread();

  const change = useMemo(() => changeBetween(base.sections, draft.sections), [base, draft]);
  const isDirty = change.sections.length + change.removed.length > 0;
  const faults = useMemo(() => checkGeometry(draft.sections), [draft.sections]);
  const steps = useMemo(
    () => [...earlier, ...draft.done.slice(base.told).map(({ words }) => words)],
    [earlier, draft, base],
  );
  useKeeping(reach.id, isDirty, { version: base.version, change, steps });

  const showStored = () => {
    const stored = baseOf(reach);
    dispatch({ type: 'restored', sections: stored.sections });
    setBase(stored);
    setKept(null);
    setEarlier([]);
    unread.clear();
  };
  const isNewer = reach.version > base.version;
  // Somebody else saved and nothing was changed here: there is nothing to ask.
  if (isNewer && !isDirty && !save.isPending) showStored();

  const count = draft.done.length;
  const saveAs = (version: number) =>
    save.mutate(
      { version, ...change, steps: steps.slice(-STEPS_TOLD) },
      {
        onSuccess: (saved) => {
          const stored = baseOf(saved);
          const isTheirsToo = version !== base.version;
          // Over theirs: what they changed elsewhere is there now, and taking a step back would lose it.
          if (isTheirsToo) dispatch({ type: 'restored', sections: stored.sections });
          // Else what was done meanwhile stays, and all of it can still be taken back.
          setBase({ ...stored, told: isTheirsToo ? 0 : count });
          setKept(null);
          setEarlier([]);
        },
      },
    );
  const put = (sections: readonly Section[], words: string, gesture?: string) =>
    dispatch({
      type: 'changed',
      sections: [...sections].sort((a, b) => a.chainage - b.chainage),
      words,
      gesture,
    });
  return {
    sections: draft.sections,
    faults,
    unread,
    isDirty,
    /** Puts other sections in place of those that stand. */
    change: put,
    /** Puts one section in place of the one of that name. */
    changeSection: (id: string, section: Section, words: string, gesture?: string) =>
      put(
        draft.sections.map((one) => (one.id === id ? section : one)),
        words,
        gesture,
      ),
    /** What would be taken back or done again, in words; null where there is nothing. */
    canUndo: draft.done[draft.done.length - 1]?.words ?? null,
    canRedo: draft.undone[draft.undone.length - 1]?.words ?? null,
    undo: () => dispatch({ type: 'undone' }),
    redo: () => dispatch({ type: 'redone' }),
    /** Why it cannot be saved as it stands; null where it can. */
    unsavable: whyNot(faults.length, unread.count),
    isSaving: save.isPending,
    wasSaved: save.isSuccess && !isDirty,
    saveError: isApiError(save.error, 'conflict') ? null : save.error,
    /** Somebody else saved since the draft began. */
    isBehind: isDirty && (isNewer || isApiError(save.error, 'conflict')),
    /** The page opened with what was changed before and not saved. */
    wasKept: kept !== null,
    save: () => saveAs(base.version),
    saveOver: () => saveAs(reach.version),
    throwAway: () => {
      showStored();
      save.reset();
    },
  };
}

export type GeometryEditor = ReturnType<typeof useGeometryEditor>;

/** As many as the server takes. */
const STEPS_TOLD = 500;

const baseOf = ({ version, sections }: Reach): Base => ({
  version,
  sections: sections.map(plain),
  told: 0,
});

function whyNot(faults: number, unread: number): string | null {
  if (unread > 0)
    return unread === 1 ? 'A number cannot be read.' : `${unread} numbers cannot be read.`;
  if (faults > 0) return faults === 1 ? 'One fault to mend.' : `${faults} faults to mend.`;
  return null;
}

/** Keeps what is not saved for the tab, and asks before the tab is closed. */
function useKeeping(id: number, isDirty: boolean, kept: Parameters<typeof keepGeometry>[1]) {
  const { version, change, steps } = kept;
  useEffect(() => {
    if (isDirty) keepGeometry(id, { version, change, steps });
    else dropGeometry(id);
  }, [id, isDirty, version, change, steps]);

  useEffect(() => {
    if (!isDirty) return undefined;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [isDirty]);
}
