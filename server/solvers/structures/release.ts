import { risingRoot } from '../boundaries/rootNear';
import type { Structure, Water } from './structure';
import type { WaterSide } from './waterSide';

/** The flow through all structures that stand side by side at one place. */
export interface Release {
  /** Flow (m³/s, positive downstream) that agrees with the stages it makes on both sides */
  solve(time: number): number;
  /** Flow (m³/s) if it changed nothing on either side, for the stage above raised by `rise` (m) */
  openFlow(time: number, rise: number): number;
  /** What the last call gave for each structure (m³/s, positive downstream) */
  readonly flows: Float64Array;
  /** m, above and below, of the last call */
  stageUp(): number;
  stageDown(): number;
}

type GivingSide = Pick<WaterSide, 'isWet' | 'stageAt' | 'mostAt' | 'velocityHead'>;

/** Structures between the water of cell `leftCell` and that of `rightCell`. */
export function createRelease(
  structures: readonly Structure[],
  left: GivingSide,
  right: GivingSide,
  leftCell: number,
  rightCell: number,
): Release {
  const count = structures.length;
  const flows = new Float64Array(count);
  const water: Water = {
    stageUp: 0,
    energyUp: 0,
    stageDown: 0,
    cellUp: leftCell,
    cellDown: rightCell,
    isForward: true,
    time: 0,
  };
  let above = 0;
  let below = 0;

  /** Signed flow through all of them with the stages that `q` makes. */
  function flowWith(q: number, rise = 0): number {
    above = left.stageAt(q) + rise;
    below = right.stageAt(q);
    const isForward = above >= below;
    const up = isForward ? left : right;
    water.isForward = isForward;
    water.cellUp = isForward ? leftCell : rightCell;
    water.cellDown = isForward ? rightCell : leftCell;
    water.stageUp = isForward ? above : below;
    water.stageDown = isForward ? below : above;
    water.energyUp = water.stageUp + up.velocityHead(q);
    const sign = up.isWet() ? (isForward ? 1 : -1) : 0;
    let sum = 0;
    for (let k = 0; k < count; k++) {
      const passed = structures[k].flow(water);
      const flow = passed === 0 ? 0 : sign * passed;
      flows[k] = flow;
      sum += flow;
    }
    // Where a structure lies lower than the bed before it the river cannot bring what it could pass.
    if (sum === 0) return 0;
    const most = up.mostAt(water.stageUp);
    if (Math.abs(sum) <= most) return sum;
    const share = most / Math.abs(sum);
    for (let k = 0; k < count; k++) flows[k] *= share;
    return sum * share;
  }
  const forwardSurplus = (q: number): number => q - flowWith(q);
  const backwardSurplus = (q: number): number => q + flowWith(-q);

  return {
    flows,
    stageUp: () => above,
    stageDown: () => below,
    openFlow(time, rise) {
      water.time = time;
      return flowWith(0, rise);
    },
    solve(time) {
      water.time = time;
      const most = flowWith(0);
      if (most === 0) return 0;
      // More flow lowers the water above and raises the one below: the surplus rises with the flow.
      const q =
        most > 0 ? risingRoot(forwardSurplus, 0, most) : -risingRoot(backwardSurplus, 0, -most);
      // Where the law of a structure jumps, as from a free to a drowned jet, the flow lies within the jump.
      const sum = flowWith(q);
      if (sum !== 0) for (let k = 0; k < count; k++) flows[k] *= q / sum;
      return q;
    },
  };
}
