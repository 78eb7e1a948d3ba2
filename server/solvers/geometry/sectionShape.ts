import type { ZoneRules } from './zoneRules';

/**
 * A cross-section as a polyline of nodes (offset x, elevation z), its segments grouped into zones of one Manning's n on
 * one side of the banks. Zones are contiguous and in order. Above its ends a section has frictionless vertical walls.
 */
export interface SectionShape {
  x: Float64Array;
  z: Float64Array;
  /** Zone of each segment */
  zone: Int32Array;
  /** Manning's n of each zone */
  zoneN: Float64Array;
  /** 0 left of bank, 1 between banks, 2 right of bank */
  zoneSide: Int32Array;
  /** Lowest elevation (m) that water can lie on without passing an embankment */
  bed: number;
  /** Of a section with embankments or storage parts; zones split where they change */
  rules?: ZoneRules;
  /** Manning's n at depth: see roughnessFactors.ts */
  roughness?: ZoneRoughness;
}

/** How Manning's n of the zones varies with stage. */
export interface ZoneRoughness {
  /** By what n of zone q is multiplied at a stage (m) */
  factorAt(q: number, stage: number): number;
  /** Stages (m) at which the factors bend */
  stages: readonly number[];
}

/** A stand-in for n = 0: its friction slope is below the last digit of any other term. */
const FRICTIONLESS = 1e-12;

/** K = A R^(2/3) / n of one zone (m³/s); A in m², P in m. */
export function zoneConveyance(area: number, perimeter: number, n: number): number {
  if (area <= 0 || perimeter <= 0) return 0;
  const cubeRoot = Math.cbrt(area / perimeter);
  return (area * cubeRoot * cubeRoot) / Math.max(n, FRICTIONLESS);
}
