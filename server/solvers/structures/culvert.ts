import type { CulvertInput } from '../../../shared/case/structures';
import { boxBarrel, circularBarrel, type Barrel } from './barrel';
import { broadCoefficient, crestHead, crestOf, drowning, power15 } from './crestFlow';
import { freeSurfaceHeadwater, fullLosses, inletHeadwater, outletHeadwater } from './culvertFlow';
import { CULVERT_INLETS } from './culvertInlets';
import type { Regime, Structure } from './structure';

const POINTS = 600;
/** The rating reaches to this X = 1.811 Q/(A D^0.5), a headwater of some thirty barrel heights; beyond Q ~ HW^0.5. */
const LARGEST_X = 29;
/** Headwater, in barrel heights, from which the full-flow form of outlet control is good (HDS-5). */
const FULL_FORM = 0.75;

/** Flow (m³/s) of one barrel by headwater above its inlet (m) over low tailwater, and what governs it. */
interface BarrelRating {
  headwaters: Float64Array;
  flows: Float64Array;
  isInlet: Uint8Array;
  invertUp: number;
  invertDown: number;
}

/** A culvert by HDS-5: the greater headwater of inlet and outlet control governs; over its road water flows as a weir. */
export function createCulvert(input: CulvertInput, chainage: number, gravity: number): Structure {
  const barrel: Barrel =
    input.shape === 'circular'
      ? circularBarrel(input.diameter)
      : boxBarrel(input.width, input.height);
  const inlet = CULVERT_INLETS[input.inlet];
  const { barrels, length, n } = input;
  const losses = fullLosses(barrel, inlet, n, length, gravity);
  const forward = rating(input.invertUp, input.invertDown);
  const backward = rating(input.invertDown, input.invertUp);
  const crest = input.crest ? crestOf(input.crest) : null;
  const weir = broadCoefficient(gravity) * (input.crestCoefficient ?? 1);
  let regime: Regime = 'dry';

  function rating(invertUp: number, invertDown: number): BarrelRating {
    const fall = invertUp - invertDown;
    const headwaters = new Float64Array(POINTS + 1);
    const flows = new Float64Array(POINTS + 1);
    const isInlet = new Uint8Array(POINTS + 1);
    const largest = (LARGEST_X * barrel.fullArea * Math.sqrt(barrel.rise)) / 1.811;
    // A barrel that rises in the direction of flow keeps what stands below its far end.
    const sill = Math.max(0, -fall);
    headwaters[0] = sill;
    isInlet[0] = 1;
    for (let k = 1; k <= POINTS; k++) {
      const flow = largest * (k / POINTS) ** 1.5;
      const byInlet = inletHeadwater(barrel, inlet, Math.max(0, fall) / length, flow, gravity);
      let byOutlet = outletHeadwater(barrel, losses, fall, flow, 0, gravity);
      if (byOutlet < FULL_FORM * barrel.rise) {
        const open = freeSurfaceHeadwater(barrel, inlet.loss, n, length, fall, flow, gravity);
        if (open < Infinity) byOutlet = open;
      }
      isInlet[k] = byInlet >= byOutlet ? 1 : 0;
      flows[k] = flow;
      headwaters[k] = Math.max(headwaters[k - 1], byInlet, byOutlet);
    }
    return { headwaters, flows, isInlet, invertUp, invertDown };
  }

  function throughBarrel(way: BarrelRating, stageUp: number, stageDown: number): number {
    const { headwaters, flows, isInlet, invertUp, invertDown } = way;
    const head = stageUp - invertUp;
    if (!(head > headwaters[0])) {
      regime = 'dry';
      return 0;
    }
    let flow: number;
    if (head >= headwaters[POINTS]) {
      flow = flows[POINTS] * Math.sqrt(head / headwaters[POINTS]);
      regime = isInlet[POINTS] === 1 ? 'inletControl' : 'outletControl';
    } else {
      let low = 0;
      let high = POINTS;
      while (high - low > 1) {
        const middle = (low + high) >> 1;
        if (headwaters[middle] <= head) low = middle;
        else high = middle;
      }
      const span = headwaters[high] - headwaters[low];
      flow = flows[low] + ((head - headwaters[low]) / span) * (flows[high] - flows[low]);
      regime = isInlet[high] === 1 ? 'inletControl' : 'outletControl';
    }
    // Tailwater: a full barrel by its losses; one that is not, like a weir at its higher invert.
    const full = barrel.fullArea * Math.sqrt((2 * gravity * (stageUp - stageDown)) / losses);
    const sill = Math.max(invertUp, invertDown);
    const share = drowning(power15(Math.max(0, stageDown - sill)), power15(stageUp - sill));
    const submerged = Math.min(1, Math.max(0, (head / barrel.rise - FULL_FORM) / (1 - FULL_FORM)));
    const held = Math.min(flow * (share + submerged * (1 - share)), full);
    if (held < 0.999 * flow)
      regime = stageDown - invertDown >= barrel.rise ? 'drownedPipe' : 'drowned';
    return held;
  }

  return {
    id: input.id,
    kind: input.kind,
    chainage,
    flow({ stageUp, energyUp, stageDown, isForward }) {
      const through = barrels * throughBarrel(isForward ? forward : backward, stageUp, stageDown);
      const above = crest ? crestHead(crest, stageUp) : 0;
      if (!crest || !(above > 0)) return through;
      regime = 'overtopped';
      return (
        through + weir * crestHead(crest, energyUp) * drowning(crestHead(crest, stageDown), above)
      );
    },
    regime: () => regime,
    lowest: () => Math.max(input.invertUp, input.invertDown),
  };
}
