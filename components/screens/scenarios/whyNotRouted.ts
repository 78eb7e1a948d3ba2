import { placeOf } from './faultPlaces';
import type { EditorState } from './useScenarioEditor';

/** Why the flood cannot be routed yet, in a few words; null where it can. */
export function whyNotRouted(
  { faults, isDirty, isSaving }: Pick<EditorState, 'faults' | 'isDirty' | 'isSaving'>,
  isChecked: boolean,
): string | null {
  if (!isChecked) return 'The reach is being read.';
  const count = new Set(faults.map(({ path }) => placeOf(path))).size;
  if (count > 0) return count === 1 ? 'One thing to mend.' : `${count} things to mend.`;
  if (isSaving) return 'It is being saved.';
  return isDirty ? 'Save it first.' : null;
}
