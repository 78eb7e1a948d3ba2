import { groundAt, thalwegOf } from '../../reaches/sectionGeometry';
import type { Section } from '../../surveys/types';

/** What the checks of a scenario must know of its reach. m. */
export interface ReachFacts {
  sections: readonly Section[];
  first: number;
  last: number;
  length: number;
  firstBed: number;
  lastBed: number;
  /** Least distance of two sections. */
  leastSpacing: number;
  /** Bed of the reach at a chainage, linear between sections. */
  bedAt: (chainage: number) => number;
}

export function reachFacts(sections: readonly Section[]): ReachFacts {
  const [head, tail] = [sections[0], sections[sections.length - 1]];
  const bed = { points: sections.map((s): [number, number] => [s.chainage, thalwegOf(s)]) };
  const spacings = sections.slice(1).map(({ chainage }, i) => chainage - sections[i].chainage);
  return {
    sections,
    first: head.chainage,
    last: tail.chainage,
    length: tail.chainage - head.chainage,
    firstBed: thalwegOf(head),
    lastBed: thalwegOf(tail),
    leastSpacing: Math.min(...spacings),
    bedAt: (chainage) => groundAt(bed, chainage),
  };
}
