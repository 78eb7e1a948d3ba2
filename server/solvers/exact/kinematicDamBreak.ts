import { findRoot } from './tools/findRoot';

/** Failing dam on an even slope S with Manning friction, far below it (from about four reservoir lengths): friction and
 *  slope balance everywhere, u = √S h^(2/3)/n, and a front (a kinematic shock) of depth h_s leads. The reservoir is the
 *  wedge of still water of depth H at the dam and length L = H/S, in a wide channel.
 *
 *    h_s² + (4/3) T h_s^(5/3) = 1,   x_s = h_s - 1 + (5/3) T h_s^(2/3),   behind it x = h - 1 + (5/3) T h^(2/3)
 *
 *  h in H, x in L from the dam, T = √S H^(2/3) t/(n L).
 *  Source: B. Hunt (1982), J. Hydraul. Div. ASCE 108(HY1), 115-126, there with Chezy friction (from memory); here from the
 *  kinematic characteristics and the volume HL/2. */
export interface KinematicDamBreak {
  /** Depth behind the front over H. */
  frontDepth: number;
  /** Place of the front over L. */
  front: number;
  /** Depth over H at a place over L; 0 beyond the front. */
  depth(place: number): number;
}

export function kinematicDamBreak(scaledTime: number): KinematicDamBreak {
  const volume = (h: number) => h * h + (4 / 3) * scaledTime * h ** (5 / 3) - 1;
  const frontDepth = findRoot(volume, 0, 1);
  const placeOf = (h: number) => h - 1 + (5 / 3) * scaledTime * h ** (2 / 3);
  const front = placeOf(frontDepth);
  return {
    frontDepth,
    front,
    depth: (place) =>
      place > front || place <= -1 ? 0 : findRoot((h) => placeOf(h) - place, 0, frontDepth),
  };
}
