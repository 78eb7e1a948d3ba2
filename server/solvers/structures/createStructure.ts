import type { StructureInput } from '../../../shared/case/structures';
import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import { createBreach } from './breach';
import { createBridge } from './bridge';
import { createCulvert } from './culvert';
import { createSluice } from './sluice';
import type { Structure } from './structure';
import { createWeir } from './weir';

/** The structure of an input, standing at the boundary between cells at `chainage` (m). */
export function createStructure(
  input: StructureInput,
  chainage: number,
  workspace: Workspace,
  tables: CellTables,
): Structure {
  switch (input.kind) {
    case 'weir':
      return createWeir(input, chainage, workspace);
    case 'sluice':
      return createSluice(input, chainage, workspace.gravity);
    case 'culvert':
      return createCulvert(input, chainage, workspace.gravity);
    case 'bridge':
      return createBridge(input, chainage, workspace, tables);
    case 'breach':
      return createBreach(input, chainage, workspace.gravity);
  }
}
