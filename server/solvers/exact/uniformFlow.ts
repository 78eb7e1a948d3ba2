import type { PrismaticSection } from './prismaticSection';
import { findRoot } from './tools/findRoot';

/** Conveyance of an undivided section by Manning's formula, K = A R^(2/3)/n with R = A/P, m³/s (SI). */
export function manningConveyance(
  section: PrismaticSection,
  manning: number,
  depth: number,
): number {
  const area = section.area(depth);
  return (area * (area / section.perimeter(depth)) ** (2 / 3)) / manning;
}

/** Depth at which K(h) √slope carries the flow, m. flow > 0, slope > 0, manning > 0. */
export function normalDepth(
  section: PrismaticSection,
  manning: number,
  slope: number,
  flow: number,
): number {
  const carried = (h: number) => manningConveyance(section, manning, h) * Math.sqrt(slope) - flow;
  return findRoot(carried, 1e-12, upperDepth(carried));
}

/** Depth at which the Froude number √(Q² B/(g A³)) is one, m. flow > 0. */
export function criticalDepth(section: PrismaticSection, gravity: number, flow: number): number {
  const excess = (h: number) => section.area(h) ** 3 * gravity - flow * flow * section.topWidth(h);
  return findRoot(excess, 1e-12, upperDepth(excess));
}

/** Depth on the other side of a hydraulic jump in a level channel: the same Q²/(g A) + I1, m. */
export function sequentDepth(
  section: PrismaticSection,
  gravity: number,
  flow: number,
  depth: number,
): number {
  const force = (h: number) => (flow * flow) / (gravity * section.area(h)) + section.thrust(h);
  const critical = criticalDepth(section, gravity, flow);
  const excess = (h: number) => force(h) - force(depth);
  if (depth > critical) return findRoot(excess, 1e-9 * critical, critical);
  return findRoot(excess, critical, upperDepth(excess, critical));
}

/** A depth, found by doubling, at which an in the end increasing function is positive. */
function upperDepth(f: (depth: number) => number, from = 1e-3): number {
  let depth = 2 * from;
  while (f(depth) < 0) depth *= 2;
  return depth;
}
