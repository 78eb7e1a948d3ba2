import type { RoughnessZone, SectionInput } from '../../../shared/case/caseFile';

/**
 * A surveyed section made ready for interpolation: nodes at every point, roughness change and bank, and the anchors
 * that correspond from section to section: left end, left bank, both ends of the lowest bed, right bank, right end.
 */
export interface PreparedSection {
  /** Offset (m) and elevation (m) of the nodes; offsets never decreasing, at most two nodes at one offset. */
  x: number[];
  z: number[];
  /** Indices of nodes: 6 with banks, 4 without. */
  anchors: number[];
  roughness: RoughnessZone[];
}

export function prepareSection(section: SectionInput, useBanks: boolean): PreparedSection {
  const { x, z } = wallEnds(section);
  const banks = useBanks ? section.banks : undefined;
  for (const [from] of section.roughness) insertNode(x, z, from);
  for (const bank of banks ?? []) insertNode(x, z, bank);

  const last = x.length - 1;
  const left = banks ? highestAt(x, z, banks[0], 'first') : 0;
  const right = banks ? highestAt(x, z, banks[1], 'last') : last;
  let low = left;
  for (let k = left; k <= right; k++) if (z[k] < z[low]) low = k;
  let lowEnd = low;
  while (lowEnd < right && z[lowEnd + 1] === z[low]) lowEnd++;
  return {
    x,
    z,
    anchors: banks ? [0, left, low, lowEnd, right, last] : [0, low, lowEnd, last],
    roughness: section.roughness,
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
