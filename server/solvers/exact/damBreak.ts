import type { PrismaticSection } from './prismaticSection';
import { riemannProblem, type RiemannSolution } from './riemannProblem';

/** Sudden and total failure of a dam at x = 0 with still water on both sides (depthBelow 0: dry bed), in a
 *  level, frictionless, prismatic channel: Ritter's and Stoker's problems, for any section. */
export function damBreak(
  section: PrismaticSection,
  gravity: number,
  depthAbove: number,
  depthBelow: number,
): RiemannSolution {
  return riemannProblem(
    section,
    gravity,
    { depth: depthAbove, velocity: 0 },
    { depth: depthBelow, velocity: 0 },
  );
}
