import type { SectionComparison, SectionFate } from '@/shared/reaches/compare/compareGeometries';

export const FATE_WORDS: Record<SectionFate, string> = {
  same: 'As it was',
  changed: 'Changed',
  moved: 'Moved',
  renamed: 'Renamed',
  added: 'New',
  removed: 'Gone',
};

/** How many of each, in words: `3 changed, 1 new, 40 as they were`. */
export function countFates(rows: readonly SectionComparison[]): string {
  const order: [SectionFate, string][] = [
    ['changed', 'changed'],
    ['moved', 'moved'],
    ['renamed', 'renamed'],
    ['added', 'new'],
    ['removed', 'gone'],
    ['same', 'as they were'],
  ];
  return order
    .map(([fate, word]) => [rows.filter((row) => row.fate === fate).length, word] as const)
    .filter(([count]) => count > 0)
    .map(([count, word]) => `${count} ${word}`)
    .join(', ');
}

/** One name, or both where it was renamed. */
export function nameOf({ before, after }: SectionComparison): string {
  if (before && after && before.id !== after.id) return `${before.id}, now ${after.id}`;
  return (after ?? before)!.id;
}
