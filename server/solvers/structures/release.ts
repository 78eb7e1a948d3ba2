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

/** Relative: near what rounding leaves of the flow */
const EXACT = 1e-14;
/** A rise that is not relied on for the next search: that of a flow that jumps */
const STEEP = 1e3;
const MOST_EVALUATIONS = 100;

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

  // What the last search found: the flow, and how fast its surplus rises with it (1 where the flow does not feel itself).
  let known = 0;
  let rise = 1;

  /**
   * The root of `q - F(q)`, F the flow with the stages that q makes, in the direction of `most` = F(0). The surplus rises with
   * q by 1 at least, since more flow lowers the water above and raises the one below: what is left of it bounds the
   * error. Secants from the flow known last, within a bracket that is halved where they do not shrink it.
   */
  function search(most: number): number {
    const sign = most > 0 ? 1 : -1;
    let low = 0;
    let high = Math.abs(most);
    let x = sign * known > 0 && sign * known < high ? sign * known : high;
    let lastX = 0;
    let lastSurplus = -high;
    let best = 0;
    let least = high;
    let width = high;
    rise = Math.min(rise, STEEP);
    for (let k = 0; k < MOST_EVALUATIONS; k++) {
      const surplus = x - sign * flowWith(sign * x);
      if (Math.abs(surplus) < least) {
        least = Math.abs(surplus);
        best = x;
      }
      if (surplus < 0) low = x;
      else high = x;
      if (k > 0) rise = Math.max(1, (surplus - lastSurplus) / (x - lastX));
      if (Math.abs(surplus) <= EXACT * x * (k > 0 ? rise : 1)) break;
      lastX = x;
      lastSurplus = surplus;
      if (high - low <= EXACT * high) break;
      x -= surplus / rise;
      const isSlow = k % 4 === 3 && high - low > 0.5 * width;
      if (k % 4 === 3) width = high - low;
      if (isSlow || !(x > low && x < high)) x = 0.5 * (low + high);
    }
    known = sign * best;
    return known;
  }

  return {
    flows,
    stageUp: () => above,
    stageDown: () => below,
    openFlow(time, up) {
      water.time = time;
      return flowWith(0, up);
    },
    solve(time) {
      water.time = time;
      const most = flowWith(0);
      if (most === 0) return 0;
      const q = search(most);
      // Where the law of a structure jumps the flow lies within the jump.
      const sum = flowWith(q);
      if (sum !== 0) for (let k = 0; k < count; k++) flows[k] *= q / sum;
      return q;
    },
  };
}
