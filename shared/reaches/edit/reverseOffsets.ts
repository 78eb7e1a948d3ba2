import type { Section } from '../../surveys/types';

/**
 * Left and right exchanged: a section that was taken looking upstream. Offsets are mirrored within the same span, so that
 * first and last stay; coordinates go with their points.
 */
export function reverseOffsets(section: Section): Section {
  const { points, banks, roughness, coordinates, storage, embankments } = section;
  const [first, last] = [points[0][0], points[points.length - 1][0]];
  const mirrored = (y: number) => round(first + last - y);
  return {
    ...section,
    points: points.map(([y, z]): [number, number] => [mirrored(y), z]).reverse(),
    banks: banks && [mirrored(banks[1]), mirrored(banks[0])],
    // A zone begins where, seen from the other side, it ended.
    roughness: roughness
      .map(([, n], i): [number, number] => [
        i + 1 < roughness.length ? mirrored(roughness[i + 1][0]) : first,
        n,
      ])
      .reverse(),
    coordinates: coordinates && [...coordinates].reverse(),
    ...(storage && {
      storage: storage
        .map((part) => ({ ...part, from: mirrored(part.to), to: mirrored(part.from) }))
        .reverse(),
    }),
    ...(embankments && {
      embankments: {
        ...(embankments.right && {
          left: { ...embankments.right, offset: mirrored(embankments.right.offset) },
        }),
        ...(embankments.left && {
          right: { ...embankments.left, offset: mirrored(embankments.left.offset) },
        }),
      },
    }),
  };
}

/** To the micrometre, so that turning twice gives what was there. */
const round = (y: number) => Math.round(y * 1e6) / 1e6;
