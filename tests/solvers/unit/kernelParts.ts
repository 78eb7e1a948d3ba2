import { createCellState } from '../../../server/solvers/geometry/cellState';
import { createCellTables } from '../../../server/solvers/geometry/cellTables';
import { shapedGrid } from '../../../server/solvers/geometry/grid';
import { createWorkspace } from '../../../server/solvers/workspace';
import type { CaseFile, SectionInput } from '../../../shared/case/caseFile';

/** The kernel's parts over a reach between two sections, dry, to be filled by hand. */
export function kernelParts(first: SectionInput, last: SectionInput, cells: number) {
  const length = last.chainage - first.chainage;
  const grid = shapedGrid({
    sections: [first, last],
    numerics: { cellSize: length / cells },
  } as CaseFile);
  const workspace = createWorkspace(grid, 9.81, 0.001);
  const tables = createCellTables(workspace);
  const state = createCellState(workspace, tables);
  return { grid, workspace, tables, state };
}

/** A section moved along the reach and up. */
export function at(section: SectionInput, chainage: number, up = 0): SectionInput {
  return {
    ...section,
    id: `${section.id}-${chainage}`,
    chainage,
    points: section.points.map(([x, z]) => [x, z + up]),
  };
}
