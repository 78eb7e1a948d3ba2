import { zoneConveyance, type SectionShape } from './sectionShape';

/** Exact polygon hydraulics at many stages at once: entry m belongs to stages[m]. */
export interface StageSweep {
  area: Float64Array;
  /** Top width just above the stage */
  width: Float64Array;
  conveyance: Float64Array;
}

/** Area, top width and conveyance of a section at `stages` (m, ascending). */
export function sweepStages(shape: SectionShape, stages: Float64Array): StageSweep {
  const count = stages.length;
  const area = new Float64Array(count);
  const width = new Float64Array(count);
  const conveyance = new Float64Array(count);
  const { zoneN, roughness } = shape;
  const sweepZone = createZoneSweep(shape, stages);
  for (let q = 0; q < zoneN.length; q++) {
    const { zoneArea, zonePerimeter } = sweepZone(q, width);
    for (let m = 0; m < count; m++) {
      area[m] += zoneArea[m];
      const n = roughness ? zoneN[q] * roughness.factorAt(q, stages[m]) : zoneN[q];
      conveyance[m] += zoneConveyance(zoneArea[m], zonePerimeter[m], n);
    }
  }
  return { area, width, conveyance };
}

/**
 * Sweeps the zones of a section one after the other: area (m²) and wetted perimeter (m) of each at `stages` (ascending);
 * its top width is added to `width`. A segment costs work only at the stages between its ends; what lies wholly under
 * water is summed by differences.
 */
export function createZoneSweep(
  { x, z, zone, bed }: SectionShape,
  stages: Float64Array,
): (q: number, width: Float64Array) => { zoneArea: Float64Array; zonePerimeter: Float64Array } {
  const count = stages.length;
  const zoneArea = new Float64Array(count);
  const zonePerimeter = new Float64Array(count);
  // From stage m on: width, width times mean height above the bed, and length that are wholly under water.
  const fullWidth = new Float64Array(count + 1);
  const fullMoment = new Float64Array(count + 1);
  const fullLength = new Float64Array(count + 1);
  const swept = { zoneArea, zonePerimeter };
  let k = 0;

  return function sweepZone(q, width) {
    zoneArea.fill(0);
    zonePerimeter.fill(0);
    fullWidth.fill(0);
    fullMoment.fill(0);
    fullLength.fill(0);
    for (; k < zone.length && zone[k] === q; k++) {
      const dx = x[k + 1] - x[k];
      const low = Math.min(z[k], z[k + 1]);
      const high = Math.max(z[k], z[k + 1]);
      const length = Math.hypot(dx, high - low);
      let m = firstAbove(stages, low);
      for (; m < count && stages[m] < high; m++) {
        const f = (stages[m] - low) / (high - low);
        zoneArea[m] += 0.5 * dx * f * (stages[m] - low);
        zonePerimeter[m] += length * f;
        width[m] += dx * f;
      }
      fullWidth[m] += dx;
      fullMoment[m] += dx * (0.5 * (low + high) - bed);
      fullLength[m] += length;
    }
    let sumWidth = 0;
    let sumMoment = 0;
    let sumLength = 0;
    for (let m = 0; m < count; m++) {
      sumWidth += fullWidth[m];
      sumMoment += fullMoment[m];
      sumLength += fullLength[m];
      zoneArea[m] += Math.max(0, sumWidth * (stages[m] - bed) - sumMoment);
      zonePerimeter[m] += sumLength;
      width[m] += sumWidth;
    }
    return swept;
  };
}

/** Index of the first stage at or above `elevation`. */
function firstAbove(stages: Float64Array, elevation: number): number {
  let lo = 0;
  let hi = stages.length;
  while (lo < hi) {
    const mid = (lo + hi) >> 1;
    if (stages[mid] < elevation) lo = mid + 1;
    else hi = mid;
  }
  return lo;
}
