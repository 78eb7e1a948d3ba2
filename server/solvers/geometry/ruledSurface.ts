import type { SectionInput } from '../../../shared/case/caseFile';
import { pairingOf, prepareSection, type PreparedSection } from './preparedSection';
import { segmentPartsOf, segmentRulesAt, type SegmentParts } from './segmentParts';
import type { SectionShape } from './sectionShape';

/**
 * The ruled surface between two surveyed sections a and b. Between corresponding anchors (ends, banks, lowest bed),
 * points at equal normalised offset are joined by straight lines; a part that is a plain wall is measured along its
 * height. Node k joins (xa, za)[k] to (xb, zb)[k]; segment k lies between nodes k and k + 1.
 */
export interface RuledSurface {
  xa: number[];
  za: number[];
  xb: number[];
  zb: number[];
  /** Manning's n of each segment on either section */
  na: number[];
  nb: number[];
  /** 0 left of bank, 1 between banks, 2 right of bank; all 1 without banks */
  side: number[];
  /** Of each segment on either section, where one of them has embankments or storage parts */
  parts?: { a: SegmentParts; b: SegmentParts };
}

const SAME = 1e-9;

export function ruledSurface(a: SectionInput, b: SectionInput): RuledSurface {
  const pairing = pairingOf(a, b);
  const pa = prepareSection(a, pairing);
  const pb = prepareSection(b, pairing);
  const ruled: RuledSurface = { xa: [], za: [], xb: [], zb: [], na: [], nb: [], side: [] };
  pa.sides.forEach((side, part) => {
    joinPart(ruled, partOf(pa, part), partOf(pb, part), side, part === 0);
  });
  for (let k = 0; k < ruled.side.length; k++) {
    ruled.na.push(roughnessOf(pa, ruled.xa, ruled.za, k));
    ruled.nb.push(roughnessOf(pb, ruled.xb, ruled.zb, k));
  }
  const isParted = [pa, pb].some(
    ({ storage, embankments }) => storage.length > 0 || embankments.left || embankments.right,
  );
  if (isParted) {
    ruled.parts = {
      a: segmentPartsOf(pa, ruled.xa, ruled.za),
      b: segmentPartsOf(pb, ruled.xb, ruled.zb),
    };
  }
  return ruled;
}

/** The section at weight w: 0 is a, 1 is b. Zones split at the banks and where n changes. */
export function sectionAt(ruled: RuledSurface, w: number): SectionShape {
  const nodes = ruled.xa.length;
  const x = new Float64Array(nodes);
  const z = new Float64Array(nodes);
  const zone = new Int32Array(nodes - 1);
  const zoneN: number[] = [];
  const segments = ruled.parts && segmentRulesAt(ruled.parts.a, ruled.parts.b, w);
  let bed = Infinity;
  for (let k = 0; k < nodes; k++) {
    x[k] = mix(ruled.xa[k], ruled.xb[k], w);
    z[k] = mix(ruled.za[k], ruled.zb[k], w);
    // A slot without width at the foot of a wall holds no water; nor does ground behind an embankment at first.
    const isOpen = k > 0 && x[k] > x[k - 1] && !(segments && segments.guarded[k - 1] === 1);
    if (isOpen) bed = Math.min(bed, z[k - 1], z[k]);
  }
  const zoneSide: number[] = [];
  const firstSegment: number[] = [];
  for (let k = 0; k < nodes - 1; k++) {
    const n = mix(ruled.na[k], ruled.nb[k], w);
    const current = zoneN.length - 1;
    const isNew =
      current < 0 ||
      zoneN[current] !== n ||
      zoneSide[current] !== ruled.side[k] ||
      (segments && !segments.same(k - 1, k));
    if (isNew) {
      zoneN.push(n);
      zoneSide.push(ruled.side[k]);
      firstSegment.push(k);
    }
    zone[k] = zoneN.length - 1;
  }
  return {
    x,
    z,
    zone,
    zoneN: Float64Array.from(zoneN),
    zoneSide: Int32Array.from(zoneSide),
    bed,
    ...(segments && { rules: segments.rulesOf(firstSegment) }),
  };
}

/** Exact where a = b, which a + w (b - a) also is, and exact at w = 1, which it is not. */
export function mix(a: number, b: number, w: number): number {
  return a === b ? a : (1 - w) * a + w * b;
}

interface Part {
  t: number[];
  x: number[];
  z: number[];
}

/** Nodes from one anchor to the next with their parameter t in 0..1. */
function partOf(section: PreparedSection, part: number): Part {
  const from = section.anchors[part];
  const to = section.anchors[part + 1];
  const x = section.x.slice(from, to + 1);
  const z = section.z.slice(from, to + 1);
  if (from === to) return { t: [0, 1], x: [x[0], x[0]], z: [z[0], z[0]] };
  const width = x[x.length - 1] - x[0];
  if (width > 0) return { t: x.map((value) => (value - x[0]) / width), x, z };
  return { t: x.map((_, k) => k / (x.length - 1)), x, z };
}

function joinPart(ruled: RuledSurface, a: Part, b: Part, side: number, first: boolean): void {
  let ia = 0;
  let ib = 0;
  let skip = !first;
  while (ia < a.t.length || ib < b.t.length) {
    const t = Math.min(a.t[ia] ?? Infinity, b.t[ib] ?? Infinity);
    const ga = groupAt(a, ia, t);
    const gb = groupAt(b, ib, t);
    // The first node of a part is the last of the part before.
    if (!skip) pushNode(ruled, ga.left, gb.left, side);
    skip = false;
    if (ga.isWall || gb.isWall) pushNode(ruled, ga.right, gb.right, side);
    ia = ga.next;
    ib = gb.next;
  }
}

interface Group {
  left: [number, number];
  right: [number, number];
  isWall: boolean;
  next: number;
}

/** The nodes of a part at t, or the point interpolated there. */
function groupAt(part: Part, from: number, t: number): Group {
  let next = from;
  while (next < part.t.length && part.t[next] <= t + SAME) next++;
  if (next > from) {
    const left: [number, number] = [part.x[from], part.z[from]];
    const right: [number, number] = [part.x[next - 1], part.z[next - 1]];
    return { left, right, isWall: next - from > 1, next };
  }
  const f = (t - part.t[from - 1]) / (part.t[from] - part.t[from - 1]);
  const point: [number, number] = [
    mix(part.x[from - 1], part.x[from], f),
    mix(part.z[from - 1], part.z[from], f),
  ];
  return { left: point, right: point, isWall: false, next };
}

function pushNode(
  ruled: RuledSurface,
  a: [number, number],
  b: [number, number],
  side: number,
): void {
  if (ruled.xa.length > 0) ruled.side.push(side);
  ruled.xa.push(a[0]);
  ruled.za.push(a[1]);
  ruled.xb.push(b[0]);
  ruled.zb.push(b[1]);
}

/** A wall takes the roughness of the side on which the water stands against it. */
function roughnessOf(section: PreparedSection, x: number[], z: number[], k: number): number {
  const isWall = x[k + 1] - x[k] <= 0;
  const descending = z[k + 1] <= z[k];
  const at = isWall ? x[k] : (x[k] + x[k + 1]) / 2;
  let n = section.roughness[0][1];
  for (const [from, value] of section.roughness) {
    if (from < at || (from === at && (!isWall || descending))) n = value;
  }
  return n;
}
