import { createContext, useContext } from 'react';
import type { Reach } from '@/shared/reaches/types';
import type { Scenario } from '@/shared/scenarios/types';
import { messageAt } from './faultPlaces';
import type { EditorState } from './useScenarioEditor';

interface Editing {
  editor: EditorState;
  scenario: Scenario;
  /** Undefined while it is being read. */
  reach: Reach | undefined;
  /** Left to look at only. */
  isLocked: boolean;
}

const EditorContext = createContext<Editing | null>(null);
export const EditorProvider = EditorContext.Provider;

/** The scenario that the parts of the editor stand in. */
export function useEditing() {
  const editing = useContext(EditorContext);
  if (!editing) throw new Error('useEditing stands outside the editor of a scenario');
  const { faults, doubts } = editing.editor;
  return {
    ...editing,
    draft: editing.editor.draft,
    dispatch: editing.editor.dispatch,
    /** What is wrong at a path of the body. */
    faultAt: (path: string) => messageAt(faults, path),
    /** What a careful person would look at there. */
    doubtAt: (path: string) => messageAt(doubts, path),
  };
}
