import {
  CASE_FORMAT,
  type CaseFile,
  type SectionInput,
  type SectionPoint,
} from '../../shared/case/caseFile';

/** Gravity of the published values, m/s². */
export const GRAVITY = 9.81;

type Parts = Pick<CaseFile, 'sections' | 'upstream' | 'downstream' | 'initial' | 'numerics'> &
  Partial<CaseFile>;

export const caseOf = (title: string, parts: Parts): CaseFile => ({
  format: CASE_FORMAT,
  title,
  gravity: GRAVITY,
  laterals: [],
  structures: [],
  ...parts,
});

/** A bottom between frictionless walls, so that R = A/width: the channel of the dam-break and bump problems. */
export const wideChannel = (width: number, bed: number): SectionPoint[] => [
  [0, bed],
  [width, bed],
];

/** Trapezoid, or with side slope 0 a rectangle with rough walls, or with bottom width 0 a triangle. */
export function trapezoidChannel(
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

const sectionAt = (chainage: number, points: SectionPoint[], manning: number): SectionInput => ({
  id: `S${chainage}`,
  chainage,
  points,
  roughness: [[points[0][0], manning]],
});

/** Sections at given chainages, of one roughness. */
export const sectionsAt = (
  chainages: readonly number[],
  manning: number,
  pointsAt: (chainage: number) => SectionPoint[],
): SectionInput[] => chainages.map((x) => sectionAt(x, pointsAt(x), manning));

/** Sections at both ends and in the middle of every cell, so that each cell has its exact bed. */
export function sectionsAtCells(
  length: number,
  cells: number,
  manning: number,
  pointsAt: (chainage: number) => SectionPoint[],
): SectionInput[] {
  const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * length) / cells);
  return sectionsAt([0, ...middles, length], manning, pointsAt);
}

/** A flow (m³/s) or stage (m) that never changes. */
export const steadyFlow = (flow: number) => ({ times: [0], flows: [flow] });
export const steadyStage = (stage: number) => ({ times: [0], stages: [stage] });
