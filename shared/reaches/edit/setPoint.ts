import type { Section } from '../../surveys/types';
import { mapEmbankments } from './mapEmbankments';
import { withPoints } from './withPoints';

/**
 * One point given another offset and elevation, m. What stood on the point goes with it: a bank mark, the beginning of a
 * roughness zone, an end of a storage part, an embankment.
 */
export function setPoint(section: Section, index: number, to: [number, number]): Section {
  const { points } = section;
  const from = points[index][0];
  const moved = withPoints(
    section,
    points.map((point, i): [number, number] => (i === index ? to : point)),
  );
  // Of a wall one end stays behind, and with it what stands on it.
  if (to[0] === from || points.some(([y], i) => i !== index && y === from)) return moved;
  const along = (y: number) => (y === from ? to[0] : y);
  const { banks, roughness, storage } = moved;
  return {
    ...moved,
    banks: banks && [along(banks[0]), along(banks[1])],
    roughness: roughness.map(([y, n]) => [along(y), n]),
    ...(storage && {
      storage: storage.map((part) => ({ ...part, from: along(part.from), to: along(part.to) })),
    }),
    ...mapEmbankments(moved, (it) => ({ ...it, offset: along(it.offset) })),
  };
}
