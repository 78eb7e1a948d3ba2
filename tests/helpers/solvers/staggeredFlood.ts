/** A flood into a closed rectangular channel with storage beside it. */
export interface StaggeredFlood {
  length: number;
  slope: number;
  /** Width that flows and whole width, m */
  flowWidth: number;
  width: number;
  /** Walls that are wetted by what flows */
  walls: number;
  manning: number;
  /** Level water at the start, m above the bed at the far end */
  stage: number;
  inflow: (time: number) => number;
  duration: number;
  every: number;
  /** Where the stage is wanted, m */
  at: number;
  gravity: number;
}

/**
 * Stages at a place by an explicit integration on a staggered grid (depths in the middle of cells, flows at faces), after
 * J. J. Stoker (1957), Water Waves, section 11.6: leap-frog in time, central in space, friction implicit. It shares nothing with
 * the solver. For smooth subcritical flow over a wet bed.
 */
export function staggeredFlood(flood: StaggeredFlood): number[] {
  const { length, slope, flowWidth, width, walls, manning, gravity } = flood;
  const cells = 400;
  const dx = length / cells;
  const dt = 0.25;
  const bed = Float64Array.from({ length: cells }, (_, i) => slope * (length - (i + 0.5) * dx));
  const stage = Float64Array.from({ length: cells }, () => flood.stage);
  const flow = new Float64Array(cells + 1);
  const next = new Float64Array(cells + 1);
  const found: number[] = [];
  const here = Math.floor(flood.at / dx);
  const advected = (i: number): number => {
    const q = 0.5 * (flow[i] + flow[i + 1]);
    return (q * q) / (flowWidth * (stage[i] - bed[i]));
  };
  for (let step = 0; step * dt <= flood.duration; step++) {
    const time = step * dt;
    if (time % flood.every === 0) found.push(0.5 * (stage[here - 1] + stage[here]));
    next[0] = flood.inflow(time + 0.5 * dt);
    for (let f = 1; f < cells; f++) {
      const depth = 0.5 * (stage[f - 1] - bed[f - 1] + stage[f] - bed[f]);
      const area = flowWidth * depth;
      const radius = area / (flowWidth + walls * depth);
      const push = -(advected(f) - advected(f - 1)) - gravity * area * (stage[f] - stage[f - 1]);
      const brake = (gravity * manning * manning * Math.abs(flow[f])) / (area * radius ** (4 / 3));
      next[f] = (flow[f] + (dt / dx) * push) / (1 + dt * brake);
    }
    flow.set(next);
    for (let i = 0; i < cells; i++) {
      stage[i] -= (dt / (width * dx)) * (flow[i + 1] - flow[i]);
    }
  }
  return found;
}
