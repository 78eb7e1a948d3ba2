import type { SectionInput } from '../../../shared/case/caseFile';
import type { Grid } from '../geometry/grid';

/** Where a surveyed section lies among the cells and the faces. */
export interface Place {
  /** Stage between index `left` and `right` of the cell arrays, at weight `weight` of the right one */
  left: number;
  right: number;
  weight: number;
  /** Flow between face `face` and the next, at weight `faceWeight` of the next */
  face: number;
  faceWeight: number;
}

export function placeOf({ chainage }: SectionInput, grid: Grid): Place {
  const { cells, dx, start } = grid;
  const p = Math.min(cells, Math.max(0, (chainage - start) / dx));
  const face = Math.min(cells - 1, Math.floor(p));
  const left = Math.min(cells, Math.max(0, Math.floor(p + 0.5)));
  const at = (i: number): number => (i === 0 ? 0 : i > cells ? cells : i - 0.5);
  return {
    left,
    right: left + 1,
    weight: (p - at(left)) / (at(left + 1) - at(left)),
    face,
    faceWeight: p - face,
  };
}
