import {
  ruledSurface,
  sectionAt,
  type RuledSurface,
} from '../../../server/solvers/geometry/ruledSurface';
import type { Embankment, SectionInput, StoragePart } from '../../case/caseFile';
import { LIMITS } from '../../limits';
import type { Section } from '../../surveys/types';
import { coordinateAt } from './coordinateAt';

/** Names what the sections between get; unique in the reach. */
export type NameSection = (above: Section, number: number) => string;

/**
 * Sections put between a and b so that none lies farther than `spacing` m from its neighbours, evenly, on the ruled surface
 * that the solver itself lays between a and b: routing gives the same with and without them, as far as the cells allow.
 * Storage parts and embankments go along where both have them; coordinates lie on the straight lines between the two.
 */
export function interpolateSections(
  a: Section,
  b: Section,
  spacing: number,
  name: NameSection,
): Section[] {
  const pieces = piecesBetween(a, b, spacing);
  if (pieces < 2) return [];
  const ruled = ruledSurface(inputOf(a), inputOf(b));
  return Array.from({ length: pieces - 1 }, (_, i) => {
    const weight = (i + 1) / pieces;
    return {
      id: name(a, i + 1),
      chainage: mix(a.chainage, b.chainage, weight),
      ...sectionOn(ruled, a, b, weight),
      ...partsBetween(a, b, weight),
    };
  });
}

/** How many pieces the stretch between two sections is cut into. */
export const piecesBetween = (
  a: Pick<Section, 'chainage'>,
  b: Pick<Section, 'chainage'>,
  spacing: number,
): number => Math.ceil((b.chainage - a.chainage) / spacing - 1e-9);

/** Sections put between every two neighbours of the chosen ones; the others stay. Throws where there would be too many. */
export function fillBetween(
  sections: readonly Section[],
  chosen: ReadonlySet<string>,
  spacing: number,
): Section[] {
  const taken = new Set(sections.map(({ id }) => id));
  const name: NameSection = (above, number) => {
    let id = `${above.id}/${number}`;
    while (taken.has(id)) id += "'";
    taken.add(id);
    return id;
  };
  const filled = sections.flatMap((section, i) => {
    const next = sections[i + 1];
    return next && chosen.has(section.id) && chosen.has(next.id)
      ? [section, ...interpolateSections(section, next, spacing, name)]
      : [section];
  });
  if (filled.length > LIMITS.upload.sections)
    throw new RangeError(
      `That makes ${filled.length} sections; a reach holds ${LIMITS.upload.sections}. Choose a wider spacing or a shorter stretch.`,
    );
  return filled;
}

const mix = (a: number, b: number, w: number): number => (a === b ? a : (1 - w) * a + w * b);

/** A section without roughness is interpolated all the same; what stands in for it is taken out again. */
const inputOf = ({ id, chainage, points, roughness, banks }: Section): SectionInput => ({
  id,
  chainage,
  points,
  roughness: roughness.length > 0 ? roughness : [[points[0][0], 1]],
  ...(banks && { banks }),
});

function sectionOn(ruled: RuledSurface, a: Section, b: Section, w: number) {
  const { x, z, zone, zoneN, zoneSide } = sectionAt(ruled, w);
  const points = Array.from(x, (offset, k): [number, number] => [offset, z[k]]);
  const roughness: [number, number][] = [];
  zone.forEach((q, k) => {
    if (k > 0 && zone[k - 1] === q) return;
    const last = roughness[roughness.length - 1];
    if (last && last[0] === x[k]) last[1] = zoneN[q];
    else if (!last || last[1] !== zoneN[q]) roughness.push([x[k], zoneN[q]]);
  });
  const side = Array.from(zone, (q) => zoneSide[q]);
  const left = side.indexOf(1);
  const right = side.lastIndexOf(1) + 1;
  return {
    points,
    roughness: a.roughness.length > 0 && b.roughness.length > 0 ? roughness : [],
    banks: a.banks && b.banks ? ([x[left], x[right]] as [number, number]) : null,
    coordinates: coordinatesOn(ruled, a, b, w),
  };
}

function coordinatesOn(ruled: RuledSurface, a: Section, b: Section, w: number) {
  const places = ruled.xa.map((offset, k): [number, number] | null => {
    const [pa, pb] = [coordinateAt(a, offset), coordinateAt(b, ruled.xb[k])];
    return pa && pb && [mix(pa[0], pb[0], w), mix(pa[1], pb[1], w)];
  });
  return places.every((place) => place !== null) ? places : null;
}

/** Storage parts pair off from the left where both have as many, embankments by their side. */
function partsBetween(a: Section, b: Section, w: number): Pick<Section, 'storage' | 'embankments'> {
  const [sa, sb] = [a.storage ?? [], b.storage ?? []];
  const storage =
    sa.length > 0 && sa.length === sb.length ? sa.map((part, i) => storageOn(part, sb[i], w)) : [];
  const left = embankmentOn(a.embankments?.left, b.embankments?.left, w);
  const right = embankmentOn(a.embankments?.right, b.embankments?.right, w);
  return {
    ...(storage.length > 0 && { storage }),
    ...((left || right) && { embankments: { ...(left && { left }), ...(right && { right }) } }),
  };
}

const storageOn = (a: StoragePart, b: StoragePart, w: number): StoragePart => ({
  from: mix(a.from, b.from, w),
  to: mix(a.to, b.to, w),
  ...(a.flowsAbove !== undefined &&
    b.flowsAbove !== undefined && { flowsAbove: mix(a.flowsAbove, b.flowsAbove, w) }),
});

const embankmentOn = (a: Embankment | undefined, b: Embankment | undefined, w: number) =>
  a && b && { offset: mix(a.offset, b.offset, w), crest: mix(a.crest, b.crest, w) };
