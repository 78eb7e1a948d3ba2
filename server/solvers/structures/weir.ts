import type { WeirInput } from '../../../shared/case/structures';
import type { Workspace } from '../workspace';
import {
  broadCoefficient,
  crestHead,
  crestLow,
  crestOf,
  drowning,
  rehbock,
  sharpCoefficient,
} from './crestFlow';
import type { Regime, Structure } from './structure';

/** Below this share of the free flow a weir counts as drowned. */
const FREE = 0.999;

/** A weir across the river: a broad crest by its energy head, a sharp one by its stage, both drowned by tailwater. */
export function createWeir(input: WeirInput, chainage: number, workspace: Workspace): Structure {
  const { bed, gravity } = workspace;
  const crest = crestOf(input.crest);
  const low = crestLow(crest);
  const isBroad = input.form === 'broad';
  const base = isBroad ? broadCoefficient(gravity) : sharpCoefficient(gravity);
  const given = input.coefficient ?? (isBroad ? 1 : null);
  let regime: Regime = 'dry';

  return {
    id: input.id,
    kind: input.kind,
    chainage,
    flow({ stageUp, energyUp, stageDown, cellUp }) {
      const above = crestHead(crest, stageUp);
      if (!(above > 0)) {
        regime = 'dry';
        return 0;
      }
      const share = drowning(crestHead(crest, stageDown), above);
      regime = share < FREE ? 'drowned' : 'free';
      const head = isBroad ? crestHead(crest, energyUp) : above;
      return base * (given ?? rehbock(stageUp - low, low - bed[cellUp])) * head * share;
    },
    regime: () => regime,
    lowest: () => low,
  };
}
