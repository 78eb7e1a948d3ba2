import type { Section } from '@/shared/surveys/types';

/** One thing that was done, with the sections before and after it. */
export interface Step {
  /** For the history and the button that takes it back: `XS-05: point 12 moved`. */
  words: string;
  before: readonly Section[];
  after: readonly Section[];
  /** Steps of one gesture carry the same mark and are taken back together. */
  gesture: string | null;
}

/** A geometry while it is edited. */
export interface GeometryDraft {
  sections: readonly Section[];
  done: readonly Step[];
  /** Taken back, the next to be done again last. */
  undone: readonly Step[];
}

export type GeometryAction =
  | { type: 'changed'; sections: readonly Section[]; words: string; gesture?: string }
  | { type: 'undone' }
  | { type: 'redone' }
  /** Another geometry in place of all that was done. */
  | { type: 'restored'; sections: readonly Section[] };

/** Steps that can be taken back; older ones are forgotten. */
const REMEMBERED = 200;

export const startDraft = (sections: readonly Section[]): GeometryDraft => ({
  sections,
  done: [],
  undone: [],
});

export function geometryDraft(draft: GeometryDraft, action: GeometryAction): GeometryDraft {
  switch (action.type) {
    case 'changed':
      return changed(draft, action);
    case 'undone': {
      const step = draft.done[draft.done.length - 1];
      if (!step) return draft;
      return {
        sections: step.before,
        done: draft.done.slice(0, -1),
        undone: [...draft.undone, step],
      };
    }
    case 'redone': {
      const step = draft.undone[draft.undone.length - 1];
      if (!step) return draft;
      return {
        sections: step.after,
        done: [...draft.done, step],
        undone: draft.undone.slice(0, -1),
      };
    }
    case 'restored':
      return startDraft(action.sections);
  }
}

function changed(
  draft: GeometryDraft,
  { sections, words, gesture }: Extract<GeometryAction, { type: 'changed' }>,
): GeometryDraft {
  const last = draft.done[draft.done.length - 1];
  const goesOn = gesture !== undefined && last?.gesture === gesture;
  const step: Step = {
    words,
    before: goesOn ? last.before : draft.sections,
    after: sections,
    gesture: gesture ?? null,
  };
  const done = goesOn ? draft.done.slice(0, -1) : draft.done;
  return { sections, done: [...done, step].slice(-REMEMBERED), undone: [] };
}
