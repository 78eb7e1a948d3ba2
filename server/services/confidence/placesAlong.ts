import type { CaseFile } from '../../../shared/case/caseFile';
import type { NamedPlace } from '../../../shared/confidence/types';
import { evenly } from '../../results/blocks/evenly';

/** As many as a long section shows, and as a member may keep. */
const PLACES = 240;

/** Chainages (m) at which the members of a set keep their peaks: sections, stations, and evenly between. Rising, no two alike. */
export function placesAlong({ sections }: CaseFile, stations: NamedPlace[]): number[] {
  const surveyed = sections.map(({ chainage }) => chainage);
  const [from, to] = [surveyed[0], surveyed[surveyed.length - 1]];
  const kept = Array.from(evenly(surveyed.length, PLACES / 2), (k) => surveyed[k]);
  const fixed = [...kept, ...stations.map(({ chainage }) => chainage)];
  const room = Math.max(2, PLACES - fixed.length);
  const between = Array.from({ length: room }, (_, k) => from + ((to - from) * k) / (room - 1));
  return [...new Set([...fixed, ...between])].sort((a, b) => a - b);
}
