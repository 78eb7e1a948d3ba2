import type { StructureInput } from '../../../shared/case/structures';
import type { Workspace } from '../workspace';
import { createBreach } from './breach';
import type { Structure } from './structure';
import { createWeir } from './weir';

/** The structure of an input, standing at the boundary between cells at `chainage` (m). */
export function createStructure(
  input: StructureInput,
  chainage: number,
  workspace: Workspace,
): Structure {
  switch (input.kind) {
    case 'weir':
      return createWeir(input, chainage, workspace);
    case 'breach':
      return createBreach(input, chainage, workspace.gravity);
  }
}
