import type { BridgeInput } from '../../../shared/case/structures';
import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Workspace } from '../workspace';
import { PIER_SHAPES, velocityOfRise } from './bridgeFlow';
import { broadCoefficient, crestHead, crestOf, drowning } from './crestFlow';
import { gateFlow, type GateFlow } from './sluiceFlow';
import type { Regime, Structure } from './structure';

const CONTRACTION = 0.611;
/** Obstruction that stands for none: less than a millimetre of rise in any river. */
const NO_PIERS = 1e-3;
/** From the soffit up to this share of the opening's height above it the flow goes over from open to pressure flow. */
const PRESSING = 0.25;

/**
 * A bridge: the rise at its piers by Yarnell, through the section of the river; above the soffit as under a gate as high
 * as the mean depth of the opening; over its deck as over a broad weir.
 */
export function createBridge(
  input: BridgeInput,
  chainage: number,
  workspace: Workspace,
  tables: CellTables,
): Structure {
  const { bed, gravity } = workspace;
  const waves = createSectionWaves(workspace, tables);
  const flowAreaAt = (cell: number, stage: number): number =>
    waves.flowAreaAt(cell, stage, tables.areaAt(cell, stage));
  const coefficient = PIER_SHAPES[input.piers];
  const alpha = Math.max(NO_PIERS, input.obstructed);
  const contraction = input.contraction ?? CONTRACTION;
  const deck = input.deck ? crestOf(input.deck) : null;
  const weir = broadCoefficient(gravity) * (input.deckCoefficient ?? 1);
  const gate: GateFlow = { q: 0, isDrowned: false };
  let regime: Regime = 'dry';

  return {
    id: input.id,
    kind: input.kind,
    chainage,
    flow({ stageUp, energyUp, stageDown, cellUp, cellDown }) {
      regime = 'free';
      // Water falls away below the piers at critical depth.
      const least = bed[cellDown] + (2 / 3) * (stageUp - bed[cellDown]);
      const tail = Math.max(stageDown, least);
      const area = flowAreaAt(cellDown, tail);
      if (!(area > 0) || !(stageUp > tail)) return 0;
      const depth = area / tables.widthAt(cellDown, tail);
      let flow = area * velocityOfRise(coefficient, alpha, depth, stageUp - tail, gravity);

      const { soffit } = input;
      if (stageUp > soffit && soffit > bed[cellUp]) {
        const opening = flowAreaAt(cellUp, soffit) * (1 - input.obstructed);
        const width = tables.widthAt(cellUp, soffit) * (1 - input.obstructed);
        const height = opening / width;
        const sill = soffit - height;
        gateFlow(gate, stageUp - sill, Math.max(0, stageDown - sill), height, contraction, gravity);
        const weight = Math.min(1, (stageUp - soffit) / (PRESSING * height));
        const pressed = width * gate.q;
        if (pressed < flow) {
          flow += weight * (pressed - flow);
          regime = gate.isDrowned ? 'drownedGate' : 'gate';
        }
      }
      const above = deck ? crestHead(deck, stageUp) : 0;
      if (!deck || !(above > 0)) return flow;
      regime = 'overtopped';
      return flow + weir * crestHead(deck, energyUp) * drowning(crestHead(deck, stageDown), above);
    },
    regime: () => regime,
    lowest: () => -Infinity,
  };
}
