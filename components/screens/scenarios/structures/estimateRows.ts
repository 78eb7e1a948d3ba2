import {
  bottomWidthOf,
  breachEstimates,
  type BreachEstimate,
  type DamInputs,
  type Estimated,
} from '@/shared/breach/breachEstimates';
import type { BreachBody } from '@/shared/scenarios/structures/schemas';
import { formatDuration, formatQuantity } from '@/shared/units/format';
import type { Quantity, UnitSystem } from '@/shared/units/units';

export interface EstimateRow extends BreachEstimate {
  /** What the fields take over; null where it cannot be a breach of this dam. */
  taken: Pick<BreachBody, 'bottomWidth' | 'sideSlope' | 'formationTime' | 'estimate'> | null;
}

/** Side slope where the authors give none and none is typed yet. */
const USUAL_SIDE_SLOPE = 1;

/** Every set of regressions as a breach of this dam. */
export function estimateRows(inputs: DamInputs, sideSlope: number | null): EstimateRow[] {
  return breachEstimates(inputs).map((estimate) => {
    const slope = estimate.sideSlope ?? sideSlope ?? USUAL_SIDE_SLOPE;
    const { width, formationTime, id } = estimate;
    const bottom = width && bottomWidthOf(width.value, slope, inputs.breachHeight);
    return {
      ...estimate,
      taken:
        bottom !== null && bottom > 0 && formationTime
          ? {
              bottomWidth: Number(bottom.toPrecision(3)),
              sideSlope: slope,
              formationTime: Math.round(formationTime.value / 60) * 60 || 60,
              estimate: id,
            }
          : null,
    };
  });
}

/** `46.1 (18.4 to 110.6)`; the band is left out where none is published. */
export function withBand(of: Estimated | null, show: (si: number) => string): string {
  if (!of) return '–';
  return of.band
    ? `${show(of.value)} (${show(of.band[0])} to ${show(of.band[1])})`
    : show(of.value);
}

export const bandOf = (of: Estimated | null, quantity: Quantity, system: UnitSystem): string =>
  withBand(of, (si) => formatQuantity(si, quantity, system));

export const timeBand = (of: Estimated | null): string => withBand(of, formatDuration);
