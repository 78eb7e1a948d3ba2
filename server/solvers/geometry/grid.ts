import type { CaseFile } from '../../../shared/case/caseFile';
import { zoneRoughness } from './roughnessFactors';
import { needsReference } from './needsReference';
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
}

export interface ShapedGrid extends Grid {
  /**
   * Shapes of the end sections and cells: first the upstream end, then the cells, then the downstream end. Made anew each
   * time, one by one: kept they would take more memory than a run.
   */
  shapes: Iterable<SectionShape>;
  /** Whether the momentum coefficient is that of compound sections */
  isCompound: boolean;
  /** Whether it is, or sections have parts that do not flow */
  isParted: boolean;
}

export function shapedGrid(caseFile: CaseFile): ShapedGrid {
  const { sections, numerics, roughnessFactors } = caseFile;
  const start = sections[0].chainage;
  const end = sections[sections.length - 1].chainage;
  const cells = Math.max(1, Math.round((end - start) / numerics.cellSize));
  const dx = (end - start) / cells;
  const chainage = Float64Array.from({ length: cells }, (_, i) => start + (i + 0.5) * dx);

  function* places(): Generator<SectionShape> {
    let k = 0;
    let ruled = ruledSurface(sections[0], sections[1]);
    yield withFactors(sectionAt(ruled, 0), start);
    for (const x of chainage) {
      while (k + 2 < sections.length && x > sections[k + 1].chainage) {
        k++;
        ruled = ruledSurface(sections[k], sections[k + 1]);
      }
      const [above, below] = [sections[k].chainage, sections[k + 1].chainage];
      yield withFactors(sectionAt(ruled, (x - above) / (below - above)), x);
    }
    const last = sections.length - 1;
    yield withFactors(sectionAt(ruledSurface(sections[last - 1], sections[last]), 1), end);
  }

  function withFactors(shape: SectionShape, x: number): SectionShape {
    const roughness = roughnessFactors && zoneRoughness(roughnessFactors, shape, x);
    return roughness ? { ...shape, roughness } : shape;
  }

  return {
    cells,
    dx,
    start,
    chainage,
    shapes: { [Symbol.iterator]: places },
    isCompound: numerics.momentum === 'compound',
    isParted: needsReference(caseFile),
  };
}

/** Where the cells of a case lie, and the lowest bed (m) at the middle of each. */
export function buildGrid(caseFile: CaseFile): Grid & { bed: Float64Array } {
  const { cells, dx, start, chainage, shapes } = shapedGrid(caseFile);
  const beds = Array.from(shapes, (shape) => shape.bed);
  return { cells, dx, start, chainage, bed: Float64Array.from(beds.slice(1, -1)) };
}
