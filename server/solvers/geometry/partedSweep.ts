import { zoneConveyance, type SectionShape } from './sectionShape';
import { createZoneSweep, type StageSweep } from './stageSweep';
import { filledAt, fillingAt, piecesAt, type Piece, type ZoneRules } from './zoneRules';

/** As StageSweep, with what flows told apart from what is only stored. */
export interface PartedSweep extends StageSweep {
  /** Area (m²) that flows and its width (m) just above the stage; the conveyance is of this area */
  flowArea: Float64Array;
  flowWidth: Float64Array;
  /** Momentum coefficient β: the flux is β Q²/A_f */
  beta: Float64Array;
}

/** A piece of a zone with what it carries when it flows in full. */
interface Carrier {
  flows: number;
  area: number;
  conveyance: number;
}

/** Where nothing of some water flows by the rules this share of it does, so that no velocity is without bound. */
export const LEAST_FLOWING = 1e-3;

/**
 * Exact polygon hydraulics of a section with embankments and storage parts at `stages` (m, ascending). `isCompound`: the
 * momentum coefficient of the zones by their conveyance, β = A_f/K² Σ K_k²/A_k; else 1.
 *
 * While a piece comes to flow (zoneRules.ts) the momentum flux Q² β/A_f goes over linearly from its value without the
 * piece to that with it: were β left at 1, the sudden growth of A_f would let the specific force fall with the
 * stage, and quiet water would be counted as supercritical.
 */
export function partedSweep(
  shape: SectionShape,
  stages: Float64Array,
  isCompound: boolean,
): PartedSweep {
  const count = stages.length;
  const make = (): Float64Array => new Float64Array(count);
  const sweep: PartedSweep = {
    area: make(),
    width: make(),
    conveyance: make(),
    flowArea: make(),
    flowWidth: make(),
    beta: make(),
  };
  const { area, width, conveyance, flowArea, flowWidth, beta } = sweep;
  const { zoneN, rules, roughness } = shape;
  const carriers: Carrier[][] = Array.from({ length: count }, () => []);
  const zoneWidth = make();
  const sweepZone = createZoneSweep(shape, stages);

  for (let q = 0; q < zoneN.length; q++) {
    zoneWidth.fill(0);
    const { zoneArea, zonePerimeter } = sweepZone(q, zoneWidth);
    for (let m = 0; m < count; m++) {
      const eta = stages[m];
      const whole = zoneArea[m];
      area[m] += rules ? whole * filledAt(rules, q, eta) : whole;
      width[m] += rules
        ? zoneWidth[m] * filledAt(rules, q, eta) + whole * fillingAt(rules, q, eta)
        : zoneWidth[m];
      const n = roughness ? zoneN[q] * roughness.factorAt(q, eta) : zoneN[q];
      const k = zoneConveyance(whole, zonePerimeter[m], n);
      for (const { share, flows, growth } of piecesOf(rules, q, eta)) {
        flowArea[m] += share * flows * whole;
        flowWidth[m] += share * (flows * zoneWidth[m] + growth * whole);
        conveyance[m] += share * flows * k;
        if (flows > 0 && whole > 0) {
          carriers[m].push({ flows, area: share * whole, conveyance: share * k });
        }
      }
    }
  }
  for (let m = 0; m < count; m++) {
    flowArea[m] = Math.max(flowArea[m], LEAST_FLOWING * area[m]);
    flowWidth[m] = Math.max(flowWidth[m], LEAST_FLOWING * width[m]);
    beta[m] = momentumOf(carriers[m], flowArea[m], isCompound);
  }
  return sweep;
}

const WHOLE: Piece[] = [{ share: 1, flows: 1, growth: 0 }];

function piecesOf(rules: ZoneRules | undefined, q: number, stage: number): Piece[] {
  return rules ? piecesAt(rules, q, stage) : WHOLE;
}

/**
 * β: of the pieces that flow in full, A_f Σ(K²/A)/(ΣK)² or A_f/ΣA; where some flow by a share, linear in the shares
 * between the values with and without them, the one that flows most first.
 */
function momentumOf(carriers: Carrier[], flowArea: number, isCompound: boolean): number {
  carriers.sort((a, b) => b.flows - a.flows);
  let sum = 0;
  let area = 0;
  let conveyance = 0;
  let squares = 0;
  for (let k = 0; k < carriers.length; k++) {
    const one = carriers[k];
    area += one.area;
    conveyance += one.conveyance;
    squares += (one.conveyance * one.conveyance) / one.area;
    const next = k + 1 < carriers.length ? carriers[k + 1].flows : 0;
    if (one.flows === next) continue;
    const isKnown = isCompound && conveyance > 0;
    const alone = isKnown ? (flowArea * squares) / (conveyance * conveyance) : flowArea / area;
    sum += (one.flows - next) * alone;
  }
  // Where nothing flows in full the rest is counted as the piece that flows most.
  return carriers.length > 0 ? sum / carriers[0].flows : 1;
}
