import type { ReachSection } from '@/shared/reaches/types';

type Placed = Pick<ReachSection, 'id' | 'chainage'>;

/** Sections that a change goes to, by id, in the order of the reach. */
export type SectionChoice = readonly string[];

export const toggleSection = (
  choice: SectionChoice,
  sections: readonly Placed[],
  id: string,
): SectionChoice =>
  inOrder(sections, (one) => (one === id ? !choice.includes(id) : choice.includes(one)));

export const allSections = (sections: readonly Placed[]): SectionChoice =>
  inOrder(sections, () => true);

/** Every section from one chainage to another, both included, whichever comes first; m. */
export function sectionsBetween(
  sections: readonly Placed[],
  from: number,
  to: number,
): SectionChoice {
  // Half a centimetre: a chainage typed with the digits shown still meets its section.
  const [first, last] = [Math.min(from, to) - 0.005, Math.max(from, to) + 0.005];
  return sections.filter(({ chainage }) => chainage >= first && chainage <= last).map(idOf);
}

const idOf = ({ id }: Placed): string => id;
const inOrder = (sections: readonly Placed[], keep: (id: string) => boolean): SectionChoice =>
  sections.map(idOf).filter(keep);

/** `XS-07`, `XS-07 and XS-08`, `5 sections, XS-07 to XS-11`. */
export function describeChoice(choice: SectionChoice): string {
  if (choice.length === 0) return 'No section';
  if (choice.length <= 2) return choice.join(' and ');
  return `${choice.length} sections, ${choice[0]} to ${choice[choice.length - 1]}`;
}
