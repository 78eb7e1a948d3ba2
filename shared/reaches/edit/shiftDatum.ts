import type { Section } from '../../surveys/types';
import { mapEmbankments } from './mapEmbankments';

/** Everything that is an elevation raised by `rise` m (below 0: lowered): another datum, a mended benchmark. */
export function shiftDatum(section: Section, rise: number): Section {
  const { points, storage } = section;
  const raised = (z: number) => round(z + rise);
  return {
    ...section,
    points: points.map(([y, z]) => [y, raised(z)]),
    ...(storage && {
      storage: storage.map((part) =>
        part.flowsAbove === undefined ? part : { ...part, flowsAbove: raised(part.flowsAbove) },
      ),
    }),
    ...mapEmbankments(section, (it) => ({ ...it, crest: raised(it.crest) })),
  };
}

/** To the micrometre: 46.2 + 0.1 is 46.3, and shifting back gives what was there. */
const round = (z: number) => Math.round(z * 1e6) / 1e6;
