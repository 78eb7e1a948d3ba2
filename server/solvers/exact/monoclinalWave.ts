import type { PrismaticSection } from './prismaticSection';
import { solveOde } from './tools/solveOde';
import { manningConveyance } from './uniformFlow';

/** A flood front of constant form: uniform flow of depth h2 ahead, of depth h1 > h2 behind, and between them a surface
 *  that moves with the speed U unchanged, in a prismatic channel of even slope with Manning friction. The full equations
 *  with Q = U A - k and h = h(x - U t) become
 *
 *    U = (Q1 - Q2)/(A1 - A2),   k = U A2 - Q2,   dh/dξ = (S0 - Q²/K²)/(1 - k² B/(g A³))
 *
 *  so this is an exact solution of unsteady flow, as smooth as the section, while k² B/(g A³) < 1 ahead; beyond that the
 *  front breaks into a bore. ξ = x - U t, m; h is the mean of both depths at ξ = 0.
 *
 *  Source: V. T. Chow (1959), Open-Channel Hydraulics, sec. 18-6 (uniformly progressive flow; section number from
 *  memory); F. M. Henderson (1966), Open Channel Flow, sec. 9.3 (the same). */
export interface MonoclinalWave {
  /** U, m/s. */
  speed: number;
  /** m */
  depth(xi: number): number;
  /** m³/s */
  flow(xi: number): number;
}

/** Nodes of the stored profile over the distance in which the depth would change at its steepest slope. */
const NODES = 40;
const TOLERANCE = 1e-12;

/** Throws a RangeError where the front would break. */
export function monoclinalWave(
  section: PrismaticSection,
  gravity: number,
  manning: number,
  slope: number,
  depthBehind: number,
  depthAhead: number,
): MonoclinalWave {
  const uniform = (h: number) => manningConveyance(section, manning, h) * Math.sqrt(slope);
  const [areaBehind, areaAhead] = [section.area(depthBehind), section.area(depthAhead)];
  const speed = (uniform(depthBehind) - uniform(depthAhead)) / (areaBehind - areaAhead);
  const overrun = speed * areaAhead - uniform(depthAhead);
  const inertia = (h: number) =>
    (overrun * overrun * section.topWidth(h)) / (gravity * section.area(h) ** 3);
  if (inertia(depthAhead) >= 1) {
    throw new RangeError(`a front from ${depthAhead} m to ${depthBehind} m breaks into a bore`);
  }
  const flowAt = (h: number) => speed * section.area(h) - overrun;
  const surface = (_: number, h: number) =>
    (slope * (1 - (flowAt(h) / uniform(h)) ** 2)) / (1 - inertia(h));

  const middle = (depthBehind + depthAhead) / 2;
  const spacing = (depthBehind - depthAhead) / -surface(0, middle) / NODES;
  const ahead = [middle];
  const behind = [middle];

  /** Integrates from the stored node nearest before xi, storing nodes on the way. */
  function depth(xi: number): number {
    const nodes = xi >= 0 ? ahead : behind;
    const step = xi >= 0 ? spacing : -spacing;
    const wanted = Math.floor(xi / step);
    while (nodes.length <= wanted) {
      const k = nodes.length - 1;
      nodes.push(solveOde(surface, k * step, (k + 1) * step, nodes[k], TOLERANCE));
    }
    return solveOde(surface, wanted * step, xi, nodes[wanted], TOLERANCE);
  }

  return { speed, depth, flow: (xi) => flowAt(depth(xi)) };
}
