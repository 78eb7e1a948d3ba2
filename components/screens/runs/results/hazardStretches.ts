import type { PlaceAlong } from '@/shared/runs/types';

export interface HazardStretch {
  /** m, half-way to the neighbours of other classes. */
  from: number;
  to: number;
  hazard: PlaceAlong['hazard'];
}

/** Neighbouring sections of one class as one stretch; each reaches half-way to the next. */
export function hazardStretches(
  places: readonly Pick<PlaceAlong, 'chainage' | 'hazard'>[],
): HazardStretch[] {
  const stretches: HazardStretch[] = [];
  places.forEach(({ chainage, hazard }, i) => {
    const next = places[i + 1]?.chainage;
    const to = next === undefined ? chainage : (chainage + next) / 2;
    const last = stretches[stretches.length - 1];
    if (last?.hazard === hazard) last.to = to;
    else stretches.push({ from: last?.to ?? chainage, to, hazard });
  });
  return stretches;
}
