import type { PrismaticSection } from './prismaticSection';
import { findRoot } from './tools/findRoot';
import { riemannVariable, waveSpeed } from './waveSpeed';

/** Exact solution of the Riemann problem in a level, frictionless, prismatic channel of any section:
 *
 *    A_t + (A u)_x = 0,   (A u)_t + (A u² + g I1)_x = 0,   (h, u) = left for x < 0, right for x > 0 at t = 0
 *
 *  The solution depends on ξ = x/t alone. Each side K sends one wave. Across it
 *    fan     u ± ω(h) constant                          f_K(h) = ω(h) - ω(h_K)                        h ≤ h_K
 *    shock   mass and momentum conserved                f_K(h) = √(g (I1 - I1_K)(A - A_K)/(A A_K))    h > h_K
 *  and the state between the waves satisfies f_L(h) + f_R(h) + u_R - u_L = 0. A bed falls dry between the
 *  waves when ω_L + ω_R ≤ u_R - u_L; a dry side has no wave of its own.
 *
 *  Sources: A. Ritter (1892), Z. VDI 36, 947-954 (dry bed); J. J. Stoker (1957), Water Waves, sec. 10.8
 *  (wet bed); E. F. Toro (2001), Shock-Capturing Methods for Free-Surface Shallow Flows, ch. 5-6 (any
 *  rectangle); ω and I1 in place of 2√(gh) and gh²/2 carry them to any section. */
export interface FlowState {
  /** m; 0 is dry. */
  depth: number;
  /** m/s; 0 where dry. */
  velocity: number;
}

export interface RiemannSolution {
  /** The state between the two waves; null where the bed is dry there. */
  star: FlowState | null;
  /** Speeds of the edges of the left and of the right wave, from left to right, m/s: of a fan its head and
   *  its tail (or its dry front), of a shock its speed twice; null on a dry side. */
  leftWave: [number, number] | null;
  rightWave: [number, number] | null;
  /** State at x/t = speed, m/s. */
  at(speed: number): FlowState;
}

const DRY: FlowState = { depth: 0, velocity: 0 };

export function riemannProblem(
  section: PrismaticSection,
  gravity: number,
  left: FlowState,
  right: FlowState,
): RiemannSolution {
  const star = starState(section, gravity, left, right);
  const leftWave = waveFrom(section, gravity, left, star);
  const mirrored = star && mirror(star);
  const rightWave = waveFrom(section, gravity, mirror(right), mirrored);
  return {
    star,
    leftWave: leftWave && leftWave.edges,
    rightWave: rightWave && [-rightWave.edges[1], -rightWave.edges[0]],
    at(speed) {
      if (leftWave && speed < leftWave.edges[1]) return leftWave.at(speed);
      if (rightWave && -speed < rightWave.edges[1]) return mirror(rightWave.at(-speed));
      return star ?? DRY;
    },
  };
}

function mirror(state: FlowState): FlowState {
  return { depth: state.depth, velocity: -state.velocity };
}

function starState(
  section: PrismaticSection,
  gravity: number,
  left: FlowState,
  right: FlowState,
): FlowState | null {
  if (left.depth <= 0 || right.depth <= 0) return null;
  const omega = (depth: number) => riemannVariable(section, gravity, depth);
  const jump = right.velocity - left.velocity;
  if (omega(left.depth) + omega(right.depth) <= jump) return null;
  const across = (side: FlowState) => {
    const omegaSide = omega(side.depth);
    return (depth: number) =>
      depth <= side.depth
        ? omega(depth) - omegaSide
        : shockJump(section, gravity, side.depth, depth);
  };
  const fromLeft = across(left);
  const fromRight = across(right);
  const mismatch = (depth: number) => fromLeft(depth) + fromRight(depth) + jump;
  let high = Math.max(left.depth, right.depth);
  while (mismatch(high) < 0) high *= 2;
  const depth = findRoot(mismatch, 0, high);
  const velocity = (left.velocity + right.velocity + fromRight(depth) - fromLeft(depth)) / 2;
  return { depth, velocity };
}

/** Difference of velocity across a shock between depths `ahead` and `behind`, m/s. */
function shockJump(
  section: PrismaticSection,
  gravity: number,
  ahead: number,
  behind: number,
): number {
  const areaAhead = section.area(ahead);
  const areaBehind = section.area(behind);
  const thrust = section.thrust(behind) - section.thrust(ahead);
  return Math.sqrt((gravity * thrust * (areaBehind - areaAhead)) / (areaBehind * areaAhead));
}

interface Wave {
  edges: [number, number];
  at(speed: number): FlowState;
}

/** The wave that a side sends leftwards relative to the water, given the state behind it (null: dry). */
function waveFrom(
  section: PrismaticSection,
  gravity: number,
  side: FlowState,
  star: FlowState | null,
): Wave | null {
  if (side.depth <= 0) return null;
  if (star && star.depth > side.depth) {
    const areaSide = section.area(side.depth);
    const areaStar = section.area(star.depth);
    const speed = (areaStar * star.velocity - areaSide * side.velocity) / (areaStar - areaSide);
    return { edges: [speed, speed], at: () => side };
  }
  const omega = (depth: number) => riemannVariable(section, gravity, depth);
  const invariant = side.velocity + omega(side.depth);
  const head = side.velocity - waveSpeed(section, gravity, side.depth);
  const tail = star ? star.velocity - waveSpeed(section, gravity, star.depth) : invariant;
  const characteristic = (depth: number) =>
    invariant - omega(depth) - waveSpeed(section, gravity, depth);
  return {
    edges: [head, tail],
    at(speed) {
      if (speed <= head) return side;
      const depth = findRoot((h) => characteristic(h) - speed, 0, side.depth);
      return { depth, velocity: invariant - omega(depth) };
    },
  };
}
