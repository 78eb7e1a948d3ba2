import type { BreachInput } from '../../../shared/case/structures';
import { createSeries } from '../sources/series';
import { breachGrowth, openedHead, type BreachOpening } from './breachOpening';
import { crestHead, crestLow, crestOf, drowning, power15 } from './crestFlow';
import type { Regime, Structure } from './structure';

const WEIR_COEFFICIENT = 1.7;
const ORIFICE_COEFFICIENT = 0.6;
const FREE = 0.999;

/**
 * A dam that fails. Over its crest and through the open breach water flows as over a broad crest, C ∫ (H - z)^1.5 ds,
 * drowned by tailwater. A pipe passes what its bottom would as a weir or what it does as an orifice,
 * C_o A sqrt(2g (η - max(η_down, middle))), whichever is less; its roof falls when the breach is whole.
 */
export function createBreach(input: BreachInput, chainage: number, gravity: number): Structure {
  const crest = crestOf(input.crest);
  const first = crest[0];
  const last = crest[crest.length - 2];
  const centre = input.centre ?? 0.5 * (first + last);
  const top = levelAt(centre);
  const startLevel = input.startLevel ?? top;
  const weir = input.weirCoefficient ?? WEIR_COEFFICIENT;
  const orifice = (input.orificeCoefficient ?? ORIFICE_COEFFICIENT) * Math.sqrt(2 * gravity);
  const isPiping = input.mode === 'piping';
  const opened: BreachOpening = { width: 0, bottom: startLevel, roof: top };
  let began = Infinity;
  let now = 0;
  let regime: Regime = 'dry';

  function levelAt(offset: number): number {
    const offsets: number[] = [];
    const levels: number[] = [];
    input.crest.forEach(([x, z]) => {
      if (offsets.length > 0 && x === offsets[offsets.length - 1]) {
        levels[levels.length - 1] = Math.min(levels[levels.length - 1], z);
      } else {
        offsets.push(x);
        levels.push(z);
      }
    });
    return createSeries(offsets, levels)(offset);
  }

  function open(time: number): void {
    const p = breachGrowth(input, time - began);
    opened.width = p * input.bottomWidth;
    opened.bottom = startLevel + p * (input.bottomLevel - startLevel);
    opened.roof = isPiping && p < 1 ? startLevel + p * (top - startLevel) : Infinity;
  }

  const headAt = (z: number): number =>
    openedHead(crest, z, centre, opened.width, opened.bottom, input.sideSlope);

  /** From ∫ h^1.5 of the stages above and below, and of the energy level above. */
  function overCrest(above: number, below: number, free: number): number {
    if (!(above > 0)) return 0;
    const share = drowning(below, above);
    if (regime === 'dry') regime = share < FREE ? 'drowned' : 'free';
    return weir * free * share;
  }

  function throughPipe(energyUp: number, stageUp: number, stageDown: number): number {
    const { width, bottom, roof } = opened;
    const head = stageUp - bottom;
    if (!(head > 0) || !(width > 0)) return 0;
    const tail = Math.max(0, stageDown - bottom);
    const share = drowning(power15(tail), power15(head));
    const open15 = weir * width * power15(energyUp - bottom) * share;
    const middle = 0.5 * (bottom + roof);
    const drop = stageUp - Math.max(stageDown, middle);
    const full =
      drop > 0 ? orifice * width * (roof - bottom) * Math.sqrt(drop) : stageUp > roof ? 0 : open15;
    if (full < open15) {
      regime = stageDown > middle ? 'drownedPipe' : 'pipe';
      return full;
    }
    regime = share < FREE ? 'drowned' : 'free';
    return open15;
  }

  return {
    id: input.id,
    kind: input.kind,
    chainage,
    flow({ energyUp, stageUp, stageDown, time }) {
      open(time);
      regime = 'dry';
      if (opened.roof < Infinity) {
        const pipe = throughPipe(energyUp, stageUp, stageDown);
        const above = crestHead(crest, stageUp);
        return pipe + overCrest(above, crestHead(crest, stageDown), crestHead(crest, energyUp));
      }
      return overCrest(headAt(stageUp), headAt(stageDown), headAt(energyUp));
    },
    regime: () => regime,
    lowest() {
      open(now);
      return opened.width > 0 ? Math.min(opened.bottom, crestLow(crest)) : crestLow(crest);
    },
    follow(stageAbove, time) {
      now = time;
      const { trigger } = input;
      if (began < Infinity) return;
      if (trigger.kind === 'time') began = trigger.time;
      else if (stageAbove >= trigger.stage) began = time;
    },
    opening() {
      open(now);
      return { width: opened.width, bottom: opened.width > 0 ? opened.bottom : startLevel };
    },
  };
}
