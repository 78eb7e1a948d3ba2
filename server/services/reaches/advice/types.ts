import type { Advice, ReachSection } from '../../../../shared/reaches/types';

/** One rule of care: looks at the described sections, in order downstream, and says what it would look at again. */
export type AdviceRule = (sections: ReachSection[]) => Advice[];

/** Ids of sections for a sentence; more than a few are counted. */
export function named(ids: string[]): string {
  const rest = ids.length > 3 ? ` and ${ids.length - 3} more` : '';
  return `${ids.slice(0, 3).join(', ')}${rest}`;
}

/** Neighbouring sections, upstream one first. */
export const pairs = (sections: ReachSection[]): [ReachSection, ReachSection][] =>
  sections.slice(1).map((below, i) => [sections[i], below]);

export const between = (above: ReachSection, below: ReachSection) =>
  0.5 * (above.chainage + below.chainage);
