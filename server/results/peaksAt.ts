import type { PlacePeaks } from '../../shared/runs/types';
import type { PlaceColumns, RunFacts } from './blocks/blockTypes';
import { mix, placeBetween } from './placeBetween';

/** Peaks at a chainage: exact at a surveyed section, linear between neighbours elsewhere; null off the reach. */
export function peaksAt(
  places: PlaceColumns,
  inflow: RunFacts['inflowPeak'],
  chainage: number,
): PlacePeaks | null {
  const between = placeBetween(places.chainage, chainage);
  if (!between) return null;
  const { lower, upper, share } = between;
  const at = (column: Float64Array) => mix(column[lower], column[upper], share);
  const peakFlow = at(places.peakFlow);
  return {
    chainage: at(places.chainage),
    bed: at(places.bed),
    peakStage: at(places.peakStage),
    peakStageTime: at(places.peakStageTime),
    peakFlow,
    peakFlowTime: at(places.peakFlowTime),
    peakDepth: at(places.peakDepth),
    peakVelocity: at(places.peakVelocity),
    arrival: arrivalAt(places.arrival[lower], places.arrival[upper], share),
    attenuation: inflow && inflow.flow > 0 ? 1 - peakFlow / inflow.flow : null,
  };
}

/** Where the wave came to only one of the two neighbours, the nearer one decides. */
function arrivalAt(lower: number, upper: number, share: number): number | null {
  const both = !Number.isNaN(lower) && !Number.isNaN(upper);
  const value = both ? mix(lower, upper, share) : share <= 0.5 ? lower : upper;
  return Number.isNaN(value) ? null : value;
}
