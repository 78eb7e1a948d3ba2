import type {
  Embankment,
  RoughnessZone,
  SectionInput,
  StoragePart,
} from '../../../shared/case/caseFile';

/**
 * A surveyed section made ready for interpolation: nodes at every point, roughness change, bank and end of a part, and
 * the anchors that correspond from section to section: left end, left embankment, left bank, both ends of the lowest
 * bed, right bank, right embankment, right end.
 */
export interface PreparedSection {
  /** Offset (m) and elevation (m) of the nodes; offsets never decreasing, at most two nodes at one offset. */
  x: number[];
  z: number[];
  /** Indices of nodes: left end, lowest bed and right end; banks and embankments where they are paired. */
  anchors: number[];
  /** Of each part between two anchors: 0 left of bank, 1 between banks, 2 right of bank; all 1 without banks */
  sides: number[];
  /** Elevation (m) of the lowest bed */
  bed: number;
  roughness: RoughnessZone[];
  storage: readonly StoragePart[];
  embankments: { left?: Embankment; right?: Embankment };
}

/** Which marks both neighbours have, so that they correspond. */
export interface Pairing {
  banks: boolean;
  leftEmbankment: boolean;
  rightEmbankment: boolean;
}

export function pairingOf(a: SectionInput, b: SectionInput): Pairing {
  return {
    banks: a.banks !== undefined && b.banks !== undefined,
    leftEmbankment: a.embankments?.left !== undefined && b.embankments?.left !== undefined,
    rightEmbankment: a.embankments?.right !== undefined && b.embankments?.right !== undefined,
  };
}

export function prepareSection(section: SectionInput, pairing: Pairing): PreparedSection {
  const { x, z } = wallEnds(section);
  const banks = pairing.banks ? section.banks : undefined;
  const { storage = [], embankments = {} } = section;
  const { left: onLeft, right: onRight } = embankments;
  for (const [from] of section.roughness) insertNode(x, z, from);
  for (const bank of banks ?? []) insertNode(x, z, bank);
  for (const { from, to } of storage) {
    insertNode(x, z, from);
    insertNode(x, z, to);
  }
  for (const embankment of [onLeft, onRight]) if (embankment) insertNode(x, z, embankment.offset);

  const last = x.length - 1;
  const foot = onLeft ? highestAt(x, z, onLeft.offset, 'first') : 0;
  const farFoot = onRight ? highestAt(x, z, onRight.offset, 'last') : last;
  const left = banks ? highestAt(x, z, banks[0], 'first') : foot;
  const right = banks ? highestAt(x, z, banks[1], 'last') : farFoot;
  let low = left;
  for (let k = left; k <= right; k++) if (z[k] < z[low]) low = k;
  let lowEnd = low;
  while (lowEnd < right && z[lowEnd + 1] === z[low]) lowEnd++;

  const outerLeft = [0, ...(pairing.leftEmbankment ? [foot] : [])];
  const outerRight = [...(pairing.rightEmbankment ? [farFoot] : []), last];
  const channel = banks ? [left, low, lowEnd, right] : [low, lowEnd];
  return {
    x,
    z,
    anchors: [...outerLeft, ...channel, ...outerRight],
    sides: banks
      ? [...outerLeft.map(() => 0), 1, 1, 1, ...outerRight.map(() => 2)]
      : [...outerLeft.map(() => 1), 1, ...outerRight.map(() => 1)],
    bed: z[low],
    roughness: section.roughness,
    storage,
    embankments,
  };
}

/** Points between the ends of a wall add no width and no area: only its two ends are kept. */
function wallEnds({ points }: SectionInput): { x: number[]; z: number[] } {
  const kept = points.filter(
    ([offset], k) =>
      k === 0 ||
      k === points.length - 1 ||
      points[k - 1][0] !== offset ||
      points[k + 1][0] !== offset,
  );
  return { x: kept.map((p) => p[0]), z: kept.map((p) => p[1]) };
}

function insertNode(x: number[], z: number[], offset: number): void {
  const k = x.findIndex((value) => value >= offset);
  if (k <= 0 || x[k] === offset) return;
  const t = (offset - x[k - 1]) / (x[k] - x[k - 1]);
  x.splice(k, 0, offset);
  z.splice(k, 0, z[k - 1] + t * (z[k] - z[k - 1]));
}

/** A bank at a wall means the top of the wall, so that the wall belongs to the channel. */
function highestAt(x: number[], z: number[], offset: number, prefer: 'first' | 'last'): number {
  let first = x.indexOf(offset);
  if (first < 0) first = offset <= x[0] ? 0 : x.length - 1;
  const second = x[first + 1] === x[first] ? first + 1 : first;
  if (z[first] === z[second]) return prefer === 'first' ? first : second;
  return z[first] > z[second] ? first : second;
}
