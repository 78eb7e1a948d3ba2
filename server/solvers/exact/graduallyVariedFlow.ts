import { solveOde } from './tools/solveOde';

/** Water surface of steady flow in a channel of any shape. From (Q²/A)_x + g A η_x + g A Q|Q|/K² = 0 with
 *  A = A(x, η), A_x at constant stage, and B = A_η:
 *
 *    η_x = [ (Q/A)² A_x - m (Q/A) Q_x - g A Q|Q|/K² ] / [ g A - (Q/A)² B ]
 *
 *  x chainage, m; η stage, m; Q flow, m³/s; Q_x lateral inflow, m²/s; K conveyance, m³/s; m = 2 where water comes in,
 *  without momentum along the channel, and 1 where it goes out, with its own. In a prismatic channel this is V. T. Chow
 *  (1959), Open-Channel Hydraulics, eq. 9-7, and with lateral flow his equations of spatially varied flow, sec. 12-1 and
 *  12-2. Singular at critical flow: start beside it and integrate away from the control.
 */
export interface SteadyReach {
  area(x: number, stage: number): number;
  topWidth(x: number, stage: number): number;
  /** Infinity without friction. */
  conveyance(x: number, stage: number): number;
  /** ∂A/∂x at constant stage, m. */
  areaGradient(x: number, stage: number): number;
  flow(x: number): number;
  lateralInflow(x: number): number;
}

export function surfaceSlope(
  reach: SteadyReach,
  gravity: number,
  x: number,
  stage: number,
): number {
  const area = reach.area(x, stage);
  const flow = reach.flow(x);
  const velocity = flow / area;
  const lateral = reach.lateralInflow(x);
  const friction = (flow * Math.abs(flow)) / reach.conveyance(x, stage) ** 2;
  const forcing =
    velocity * velocity * reach.areaGradient(x, stage) -
    (lateral > 0 ? 2 : 1) * velocity * lateral -
    gravity * area * friction;
  return forcing / (gravity * area - velocity * velocity * reach.topWidth(x, stage));
}

/** Stages at `places` (m, in the order of travel, the first being where `stage` is known). The integration
 *  stops at each place, so kinks of the geometry belong there. */
export function surfaceProfile(
  reach: SteadyReach,
  gravity: number,
  places: readonly number[],
  stage: number,
  tolerance = 1e-10,
): number[] {
  const slope = (x: number, eta: number) => surfaceSlope(reach, gravity, x, eta);
  const stages = [stage];
  for (let i = 1; i < places.length; i++) {
    stages.push(solveOde(slope, places[i - 1], places[i], stages[i - 1], tolerance));
  }
  return stages;
}
