import {
  CASE_FORMAT,
  type CaseFile,
  type SectionInput,
  type SectionPoint,
} from '@/shared/case/caseFile';

/** Gravity of the published values that the tests compare with. */
export const GRAVITY = 9.81;

type CaseParts = Pick<CaseFile, 'sections' | 'upstream' | 'downstream' | 'initial' | 'numerics'> &
  Partial<CaseFile>;

export function buildCase(parts: CaseParts): CaseFile {
  return {
    format: CASE_FORMAT,
    title: 'test',
    gravity: GRAVITY,
    laterals: [],
    structures: [],
    ...parts,
  };
}

/** Points of a trapezoid; `height` is that of its top above its bed. */
export function trapezoidPoints(
  bottomWidth: number,
  sideSlope: number,
  bed: number,
  height: number,
): SectionPoint[] {
  const side = sideSlope * height;
  const points: SectionPoint[] = [
    [0, bed + height],
    [side, bed],
    [side + bottomWidth, bed],
    [2 * side + bottomWidth, bed + height],
  ];
  return bottomWidth > 0 ? points : points.filter((_, i) => i !== 2);
}

/** A bottom without walls: above its ends stand frictionless ones, so that R = A/width. */
export function openRectanglePoints(width: number, bed: number): SectionPoint[] {
  return [
    [0, bed],
    [width, bed],
  ];
}

/** One section of a single roughness. */
export function buildSection(
  chainage: number,
  points: SectionPoint[],
  manning: number,
): SectionInput {
  return { id: `S${chainage}`, chainage, points, roughness: [[points[0][0], manning]] };
}

/** Sections at `count` equal steps from `from` to `to`, ends included. */
export function buildSections(
  from: number,
  to: number,
  count: number,
  manning: number,
  pointsAt: (chainage: number) => SectionPoint[],
): SectionInput[] {
  return Array.from({ length: count }, (_, i) => {
    const chainage = i === count - 1 ? to : from + ((to - from) * i) / (count - 1);
    return buildSection(chainage, pointsAt(chainage), manning);
  });
}

/** Sections at both ends of a reach and in the middle of each of its cells, so that every cell has its exact bed. */
export function buildSectionsAtCells(
  length: number,
  cells: number,
  manning: number,
  pointsAt: (chainage: number) => SectionPoint[],
): SectionInput[] {
  const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * length) / cells);
  return [0, ...middles, length].map((x) => buildSection(x, pointsAt(x), manning));
}

/** A flow or stage that never changes, as the series of a boundary. */
export const steadyFlow = (flow: number) => ({ times: [0], flows: [flow] });
export const steadyStage = (stage: number) => ({ times: [0], stages: [stage] });
