import { useEffect, useMemo, useReducer, useState } from 'react';
import { isApiError } from '@/components/queries/ApiError';
import { useSaveScenario } from '@/components/queries/scenarios';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Fault } from '@/shared/errors';
import type { Reach } from '@/shared/reaches/types';
import { canonical } from '@/shared/case/canonical';
import { checkScenario } from '@/shared/scenarios/checkScenario';
import type { ScenarioBody } from '@/shared/scenarios/schemas';
import type { Scenario } from '@/shared/scenarios/types';
import { hasUnreadable, toBody, toDraft, type Draft } from './draft';
import { draftReducer } from './draftReducer';
import { dropDraft, keepDraft, keptDraft } from './draftStore';
import { clockFromText } from './startClock';

/** What the draft began from: its version, and its body as text to compare with. */
interface Base {
  version: number;
  text: string;
}

/** A scenario while it is edited: what was typed, what is wrong with it, and whether it is saved. */
export function useScenarioEditor(scenario: Scenario, reach: Reach | undefined) {
  const [kept, setKept] = useState(() => keptDraft(scenario.id));
  const [draft, dispatch] = useReducer(draftReducer, kept?.draft ?? toDraft(scenario.body));
  const [base, setBase] = useState<Base>(() => ({
    ...baseOf(scenario),
    version: kept?.version ?? scenario.version,
  }));
  const save = useSaveScenario(scenario.studyId, scenario.id);

  const body = useMemo(() => toBody(draft), [draft]);
  const clockFault = clockFromText(draft.startsAt).fault;
  const isUnreadable = useMemo(() => hasUnreadable(draft), [draft]);
  const isDirty = useMemo(
    () => isUnreadable || clockFault !== null || canonical(body) !== base.text,
    [isUnreadable, clockFault, body, base],
  );
  const check = useCheck(body, reach, clockFault);
  useKeeping(scenario.id, isDirty, base.version, draft);

  /** Shows what is stored, in place of what was typed. */
  const showStored = () => {
    dispatch({ type: 'restored', draft: toDraft(scenario.body) });
    setBase(baseOf(scenario));
    setKept(null);
  };
  const isNewer = scenario.version > base.version;
  // Somebody else saved and nothing was typed here: there is nothing to ask.
  if (isNewer && !isDirty && !save.isPending) showStored();

  const saveAs = (version: number) =>
    save.mutate(
      { version, body },
      {
        onSuccess: (saved) => {
          setBase(baseOf(saved));
          setKept(null);
        },
      },
    );
  return {
    draft,
    dispatch,
    ...check,
    isDirty,
    /** Why it cannot be saved as it stands; null where it can. */
    unsavable: clockFault ?? (isUnreadable ? 'A number cannot be read.' : null),
    isSaving: save.isPending,
    saveError: isApiError(save.error, 'conflict') ? null : save.error,
    /** Somebody else saved since the draft began. */
    isBehind: isNewer || isApiError(save.error, 'conflict'),
    /** The page opened with what was typed before and not saved. */
    wasKept: kept !== null,
    save: () => saveAs(base.version),
    saveOver: () => saveAs(scenario.version),
    throwAway: () => {
      showStored();
      save.reset();
    },
  };
}

export type EditorState = ReturnType<typeof useScenarioEditor>;

const baseOf = ({ version, body }: { version: number; body: ScenarioBody }): Base => ({
  version,
  text: canonical(toBody(toDraft(body))),
});

/** Faults and doubts as one types; none while the reach is being read. */
function useCheck(body: ScenarioBody, reach: Reach | undefined, clockFault: string | null) {
  const system = useUnitSystem();
  return useMemo(() => {
    const { faults, doubts } = reach ? checkScenario(body, reach.sections, system) : NOT_CHECKED;
    const own: Fault[] = clockFault ? [{ path: 'startsAt', message: clockFault }] : [];
    return { faults: [...own, ...faults], doubts };
  }, [body, reach, clockFault, system]);
}

const NOT_CHECKED: { faults: Fault[]; doubts: Fault[] } = { faults: [], doubts: [] };

/** Keeps what is not saved for the tab, and asks before the tab is closed. */
function useKeeping(id: number, isDirty: boolean, version: number, draft: Draft) {
  useEffect(() => {
    if (isDirty) keepDraft(id, { version, draft });
    else dropDraft(id);
  }, [id, isDirty, version, draft]);

  useEffect(() => {
    if (!isDirty) return undefined;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [isDirty]);
}
