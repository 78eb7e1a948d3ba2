/** A stretch of a cross-section under water, as a closed ring of [offset, elevation]. */
export type WetRing = [number, number][];

/**
 * The water in a cross-section at a stage: one ring for each stretch whose ground lies below it. Walls stand at the
 * ends, as the solver has them, so that water above the ends fills up to the first and last offset.
 */
export function sectionWater(points: readonly (readonly [number, number])[], stage: number) {
  const rings: WetRing[] = [];
  let ring: WetRing | null = null;
  const close = (offset: number) => {
    if (!ring) return;
    ring.push([offset, stage]);
    if (ring.length > 2) rings.push(ring);
    ring = null;
  };
  for (let i = 0; i < points.length; i++) {
    const [offset, ground] = points[i];
    const wet = ground < stage;
    if (i > 0) {
      const [before, groundBefore] = points[i - 1];
      const wasWet = groundBefore < stage;
      if (wet !== wasWet) {
        const share = (stage - groundBefore) / (ground - groundBefore);
        const shore = before + share * (offset - before);
        if (wet) ring = [[shore, stage]];
        else close(shore);
      }
    } else if (wet) ring = [[offset, stage]];
    if (wet) ring?.push([offset, ground]);
  }
  if (points.length) close(points[points.length - 1][0]);
  return rings;
}

/** Width of the water surface over all its stretches, m. */
export const wetWidth = (rings: readonly WetRing[]): number =>
  rings.reduce((sum, ring) => sum + ring[ring.length - 1][0] - ring[0][0], 0);
