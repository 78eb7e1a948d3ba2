import { createContext, useContext } from 'react';
import type { Reach } from '@/shared/reaches/types';
import type { Section } from '@/shared/surveys/types';
import type { GeometryEditor } from './useGeometryEditor';

interface Editing {
  editor: GeometryEditor;
  reach: Reach;
  /** The section that is shown and changed. */
  section: Section;
  /** Points of the same section as surveyed; undefined where the survey has none of that name. */
  surveyed: Section | undefined;
  /** To another section, by its place. */
  goTo: (chainage: number) => void;
}

const EditorContext = createContext<Editing | null>(null);
export const EditorProvider = EditorContext.Provider;

/** The geometry that the parts of the editor stand in. */
export function useEditing() {
  const editing = useContext(EditorContext);
  if (!editing) throw new Error('useEditing stands outside the editor of a geometry');
  const { editor, section } = editing;
  return {
    ...editing,
    /** Changes the section that is shown. */
    put: (changed: Section, words: string, gesture?: string) =>
      editor.changeSection(section.id, changed, `${section.id}: ${words}`, gesture),
    /** What is wrong at a path of the section that is shown. */
    faultAt: (path: string): string | undefined =>
      editor.faults.find((fault) => fault.sectionId === section.id && fault.path === path)?.message,
  };
}
