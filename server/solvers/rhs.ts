import type { Boundary } from './boundaries/boundary';
import type { Kernel } from './kernel';
import type { LocalLosses } from './sources/localLosses';
import type { StructureSet } from './structures/structureSet';

/**
 * The fluxes of the present state at a time (s), into the workspace; returns the fastest wave at the ends and structures (m/s).
 * Friction and laterals act where a step is made: time/steps.ts.
 */
export type Rhs = (time: number) => number;

export function createRhs(
  kernel: Kernel,
  upstream: Boundary,
  downstream: Boundary,
  order: 1 | 2,
  structures: StructureSet | null = null,
  localLosses: LocalLosses | null = null,
): Rhs {
  return function rhs(time) {
    if (order === 2) {
      kernel.slopes();
      structures?.slopes();
    }
    kernel.fluxes();
    const endSpeed = Math.max(upstream(time), downstream(time));
    const fastest = structures ? Math.max(endSpeed, structures.fluxes(time)) : endSpeed;
    localLosses?.apply();
    return fastest;
  };
}
