import type { SectionInput } from '../../../shared/case/caseFile';
import { ruledSurface, sectionAt } from './ruledSurface';
import { zoneConveyance, type SectionShape } from './sectionShape';

/** Exact hydraulics of a surveyed section at one stage. */
export interface SectionProperties {
  /** m above the lowest bed; 0 when dry */
  depth: number;
  /** m² */
  area: number;
  /** m */
  topWidth: number;
  /** m; no perimeter on the divides between zones */
  perimeter: number;
  /** A/P, m */
  hydraulicRadius: number;
  /** K = Σ A_k R_k^(2/3)/n_k, m³/s; Infinity where a wetted zone has n = 0 */
  conveyance: number;
  /** Energy coefficient Σ(K³/A²)/(K³/A²); 1 where it cannot be told */
  alpha: number;
  /** Momentum coefficient Σ(K²/A)/(K²/A); 1 where it cannot be told */
  beta: number;
}

/** The shape of a surveyed section, to be asked again and again. */
export function sectionShape(section: SectionInput): SectionShape {
  return sectionAt(ruledSurface(section, section), 0);
}

/**
 * Exact hydraulics of a section (or its shape) at `stage` (m). Coefficients: Chow (1959), Open-Channel Hydraulics,
 * chapter 2, for a section divided at the banks and where n changes.
 */
export function sectionProperties(
  section: SectionInput | SectionShape,
  stage: number,
): SectionProperties {
  const shape = 'zone' in section ? section : sectionShape(section);
  const zones = shape.zoneN.length;
  const areas = new Float64Array(zones);
  const perimeters = new Float64Array(zones);
  let topWidth = 0;
  for (let k = 0; k < shape.zone.length; k++) {
    const dx = shape.x[k + 1] - shape.x[k];
    const low = Math.min(shape.z[k], shape.z[k + 1]);
    const high = Math.max(shape.z[k], shape.z[k + 1]);
    if (stage < low || (stage === low && high > low)) continue;
    const f = stage >= high ? 1 : (stage - low) / (high - low);
    const mean = stage >= high ? stage - 0.5 * (low + high) : 0.5 * (stage - low);
    areas[shape.zone[k]] += dx * f * mean;
    perimeters[shape.zone[k]] += Math.hypot(dx, high - low) * f;
    topWidth += dx * f;
  }
  let area = 0;
  let perimeter = 0;
  let conveyance = 0;
  let sum2 = 0;
  let sum3 = 0;
  let frictionless = false;
  for (let q = 0; q < zones; q++) {
    if (areas[q] <= 0) continue;
    const k = zoneConveyance(areas[q], perimeters[q], shape.zoneN[q]);
    if (shape.zoneN[q] === 0) frictionless = true;
    area += areas[q];
    perimeter += perimeters[q];
    conveyance += k;
    sum2 += (k * k) / areas[q];
    sum3 += (k * k * k) / (areas[q] * areas[q]);
  }
  const known = conveyance > 0 && !frictionless;
  return {
    depth: Math.max(0, stage - shape.bed),
    area,
    topWidth: area > 0 ? topWidth : 0,
    perimeter,
    hydraulicRadius: perimeter > 0 ? area / perimeter : 0,
    conveyance: frictionless ? Infinity : conveyance,
    alpha: known ? (sum3 * area * area) / (conveyance * conveyance * conveyance) : 1,
    beta: known ? (sum2 * area) / (conveyance * conveyance) : 1,
  };
}
