import type { SluiceInput } from '../../../shared/case/structures';
import { createSeries } from '../sources/series';
import { broadCoefficient, drowning, power15 } from './crestFlow';
import { gateFlow, type GateFlow } from './sluiceFlow';
import type { Regime, Structure } from './structure';

/** Of a sharp-edged vertical gate. */
const CONTRACTION = 0.611;
const FREE = 0.999;

/** A sluice gate over a level sill: what flows under the gate, or over the sill where the water hardly touches it. */
export function createSluice(input: SluiceInput, chainage: number, gravity: number): Structure {
  const { width, sill } = input;
  const contraction = input.contraction ?? CONTRACTION;
  const openingAt = createSeries(input.times, input.openings);
  const weir = broadCoefficient(gravity);
  const gate: GateFlow = { q: 0, isDrowned: false };
  let regime: Regime = 'dry';

  return {
    id: input.id,
    kind: input.kind,
    chainage,
    flow({ stageUp, energyUp, stageDown, time }) {
      const opening = openingAt(time);
      const up = stageUp - sill;
      const down = Math.max(0, stageDown - sill);
      if (!(opening > 0) || !(up > 0)) {
        regime = opening > 0 ? 'dry' : 'closed';
        return 0;
      }
      const share = drowning(power15(down), power15(up));
      const open = weir * power15(energyUp - sill) * share;
      gateFlow(gate, up, down, opening, contraction, gravity);
      if (open <= gate.q) {
        regime = share < FREE ? 'drowned' : 'free';
        return width * open;
      }
      regime = gate.isDrowned ? 'drownedGate' : 'gate';
      return width * gate.q;
    },
    regime: () => regime,
    lowest: () => (input.openings[0] > 0 ? sill : Infinity),
  };
}
