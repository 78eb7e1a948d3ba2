import type { RoughnessFactor } from '../../../shared/case/caseFile';
import { createSeries } from '../sources/series';
import type { SectionShape, ZoneRoughness } from './sectionShape';

/**
 * Manning's n of a section at chainage `at` (m) under the factors whose stretch holds it; undefined under none. The depth of
 * a factor is that of the water over the lowest bed of its part: of the section, of the channel, or of the overbank on
 * the side of the zone. Several factors multiply.
 */
export function zoneRoughness(
  factors: readonly RoughnessFactor[],
  shape: SectionShape,
  at: number,
): ZoneRoughness | undefined {
  const here = factors.filter(({ from, to }) => from <= at && at <= to);
  if (here.length === 0) return undefined;
  const { zoneSide } = shape;
  const bedOf = lowestBeds(shape);
  const stages = new Set<number>();
  const byZone = Array.from(zoneSide, (side) => {
    const overbank = side !== 1;
    return here
      .filter(({ part }) => part === 'all' || (part === 'overbank') === overbank)
      .map(({ part, depths, factors: values }) => {
        const bed = part === 'all' ? shape.bed : bedOf[side];
        for (const depth of depths) if (depths.length > 1) stages.add(bed + depth);
        return { bed, factor: createSeries(depths, values) };
      });
  });
  return {
    factorAt: (q, stage) =>
      byZone[q].reduce((product, { bed, factor }) => product * factor(stage - bed), 1),
    stages: [...stages],
  };
}

/** Lowest elevation (m) left of bank, between banks and right of bank. */
function lowestBeds({ x, z, zone, zoneSide }: SectionShape): number[] {
  const beds = [Infinity, Infinity, Infinity];
  for (let k = 0; k < zone.length; k++) {
    const side = zoneSide[zone[k]];
    if (x[k + 1] > x[k]) beds[side] = Math.min(beds[side], z[k], z[k + 1]);
  }
  return beds;
}
