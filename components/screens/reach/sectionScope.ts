import type { ReachSection } from '@/shared/reaches/types';
import { allSections, sectionsBetween, type SectionChoice } from './sectionChoice';

type Placed = Pick<ReachSection, 'id' | 'chainage'>;

/** Which sections a change goes to. */
export type Scope = 'here' | 'stretch' | 'ticked' | 'all';

export interface ScopeChoice {
  scope: Scope;
  /** Stretch only, m. */
  from: number | null;
  to: number | null;
}

/** Their ids in the order of the reach; none while the stretch is not told. */
export function sectionsInScope(
  { scope, from, to }: ScopeChoice,
  sections: readonly Placed[],
  here: Placed,
  ticked: SectionChoice,
): SectionChoice {
  if (scope === 'here') return [here.id];
  if (scope === 'ticked') return ticked;
  if (scope === 'all') return allSections(sections);
  return from === null || to === null ? [] : sectionsBetween(sections, from, to);
}
