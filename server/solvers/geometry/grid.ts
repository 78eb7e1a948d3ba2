import type { CaseFile } from '../../../shared/case/caseFile';
import { zoneRoughness } from './roughnessFactors';
import { ruledSurface, sectionAt } from './ruledSurface';
import type { SectionShape } from './sectionShape';

/** The reach cut into equal cells. */
export interface Grid {
  /** Number of cells */
  cells: number;
  /** Length of a cell (m) */
  dx: number;
  /** Chainage (m) of the upstream end */
  start: number;
  /** Chainage (m) of the middle of each cell */
  chainage: Float64Array;
  /** Lowest bed (m) at the middle of each cell */
  bed: Float64Array;
}

/** Shapes of the end sections and cells: 0 is the upstream end, 1..cells the cells, cells + 1 the downstream end. */
export interface ShapedGrid extends Grid {
  shapes: SectionShape[];
  /** Whether the momentum coefficient is that of compound sections */
  isCompound: boolean;
}

export function shapedGrid({ sections, numerics, roughnessFactors }: CaseFile): ShapedGrid {
  const start = sections[0].chainage;
  const length = sections[sections.length - 1].chainage - start;
  const cells = Math.max(1, Math.round(length / numerics.cellSize));
  const dx = length / cells;
  const chainage = new Float64Array(cells);
  const bed = new Float64Array(cells);
  const shapes: SectionShape[] = [];

  let k = 0;
  let ruled = ruledSurface(sections[0], sections[1]);
  const add = (shape: SectionShape, at: number): void => {
    const roughness = roughnessFactors && zoneRoughness(roughnessFactors, shape, at);
    shapes.push(roughness ? { ...shape, roughness } : shape);
  };
  add(sectionAt(ruled, 0), start);
  for (let i = 0; i < cells; i++) {
    const x = start + (i + 0.5) * dx;
    while (k + 2 < sections.length && x > sections[k + 1].chainage) {
      k++;
      ruled = ruledSurface(sections[k], sections[k + 1]);
    }
    const shape = sectionAt(
      ruled,
      (x - sections[k].chainage) / (sections[k + 1].chainage - sections[k].chainage),
    );
    chainage[i] = x;
    bed[i] = shape.bed;
    add(shape, x);
  }
  const last = sections.length - 1;
  add(sectionAt(ruledSurface(sections[last - 1], sections[last]), 1), sections[last].chainage);
  const isCompound = numerics.momentum === 'compound';
  return { cells, dx, start, chainage, bed, shapes, isCompound };
}

/** Where the cells of a case lie, and their beds. */
export function buildGrid(caseFile: CaseFile): Grid {
  const { cells, dx, start, chainage, bed } = shapedGrid(caseFile);
  return { cells, dx, start, chainage, bed };
}
