import type { Section } from '../../surveys/types';
import { groundAt } from '../sectionGeometry';
import { coordinateAt } from '../edit/coordinateAt';
import type { PlanFeature, Position } from './geoJson';

/** Edges of the water at one section at its peak. */
export interface WetEdges {
  id: string;
  chainage: number;
  /** m. */
  stage: number;
  left: Position;
  right: Position;
}

export interface FloodExtent {
  features: PlanFeature[];
  /** Pairs of sections between which nothing is drawn, since their lines cross there: `XS-04 to XS-05`. */
  crossing: string[];
}

/**
 * Outermost edges of the water at a stage, placed on the section's own coordinates; as the solver has it, ground below the
 * stage is wet wherever it lies, but for what an embankment that is not overtopped keeps dry. null where the section is dry
 * or has no coordinates.
 */
export function wetEdges(section: Section, stage: number): WetEdges | null {
  const offsets = edgeOffsets(openGround(section, stage), stage);
  const [left, right] = offsets?.map((offset) => coordinateAt(section, offset)) ?? [];
  return left && right ? { id: section.id, chainage: section.chainage, stage, left, right } : null;
}

/** The ground between those embankments whose crest the stage does not reach. */
function openGround(section: Section, stage: number): Section['points'] {
  const { points, embankments = {} } = section;
  const { left, right } = embankments;
  const from = left && stage <= left.crest ? left.offset : -Infinity;
  const to = right && stage <= right.crest ? right.offset : Infinity;
  const at = (offset: number): Section['points'] =>
    Number.isFinite(offset) ? [[offset, groundAt(section, offset)]] : [];
  return [...at(from), ...points.filter(([y]) => y > from && y < to), ...at(to)];
}

function edgeOffsets(points: Section['points'], stage: number): [number, number] | null {
  const first = points.findIndex(([, z]) => z < stage);
  if (first < 0) return null;
  let last = first;
  points.forEach(([, z], i) => {
    if (z < stage) last = i;
  });
  return [shoreBeside(points, first, -1, stage), shoreBeside(points, last, 1, stage)];
}

/** Where the water ends beyond a wet point; at the section's end against its wall. */
function shoreBeside(points: Section['points'], wet: number, step: 1 | -1, stage: number): number {
  const [y0, z0] = points[wet];
  const dry = points[wet + step];
  return dry ? y0 + ((dry[0] - y0) * (stage - z0)) / (dry[1] - z0) : y0;
}

/**
 * The water between every two neighbouring sections that are wet at their peak: left edge to left edge and right to right by
 * straight lines. Between sections it is drawn, not computed.
 */
export function floodExtent(
  sections: readonly Section[],
  peakStages: ReadonlyMap<string, number>,
): FloodExtent {
  const edges = sections.map((section) => {
    const stage = peakStages.get(section.id);
    return stage === undefined ? null : wetEdges(section, stage);
  });
  const extent: FloodExtent = { features: [], crossing: [] };
  edges.slice(1).forEach((below, i) => {
    const above = edges[i];
    if (!above || !below) return;
    const isCrossed =
      cross(above.left, below.left, above.right, below.right) ||
      cross(above.left, above.right, below.left, below.right);
    if (isCrossed) extent.crossing.push(`${above.id} to ${below.id}`);
    else extent.features.push(between(above, below));
  });
  return extent;
}

function between(above: WetEdges, below: WetEdges): PlanFeature {
  const ring: Position[] = [above.left, above.right, below.right, below.left];
  const closed = (area(ring) < 0 ? ring.reverse() : ring).map((p): Position => [...p]);
  return {
    type: 'Feature',
    // RFC 7946, section 3.1.6: closed, the outer ring anticlockwise.
    geometry: { type: 'Polygon', coordinates: [[...closed, [...closed[0]]]] },
    properties: {
      kind: 'peakExtent',
      from: above.id,
      to: below.id,
      fromPeakStage: above.stage,
      toPeakStage: below.stage,
      betweenSections: 'drawn, not computed',
    },
  };
}

/** Twice the signed area, above 0 anticlockwise. */
const area = (ring: Position[]): number =>
  ring.reduce((sum, [x, y], i) => {
    const [nextX, nextY] = ring[(i + 1) % ring.length];
    return sum + x * nextY - nextX * y;
  }, 0);

/** Whether the pieces a–b and c–d cross. */
function cross(a: Position, b: Position, c: Position, d: Position): boolean {
  const turn = (p: Position, q: Position, r: Position) =>
    Math.sign((q[0] - p[0]) * (r[1] - p[1]) - (q[1] - p[1]) * (r[0] - p[0]));
  return turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0;
}
