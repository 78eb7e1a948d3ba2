import type { DamInputs } from '../../breach/breachEstimates';
import { crestPoints, levelAt, poolVolume } from '../../structures/crests';
import type { Section } from '../../surveys/types';
import type { ReservoirEnd, Upstream } from '../schemas';
import type { BreachBody, DamData } from './schemas';

/**
 * What the scenario itself says of a dam: heights from crest and bottom of the breach, volumes from the storage table of a reservoir at
 * the head, or elsewhere from the sections above the dam as a level pool. Only what can be told; SI.
 */
export function damDataOf(
  breach: BreachBody,
  upstream: Upstream,
  sections: readonly Section[],
): Partial<DamData> {
  const { bottomLevel, chainage } = breach;
  const height = breachHeightOf(breach);
  const stage = stageAtFailure(breach, upstream);
  if (bottomLevel === null || height === null) return {};
  if (stage === null) return { height };
  const waterDepth = stage - bottomLevel;
  if (upstream.kind === 'reservoir' && chainage === sections[0].chainage) {
    const { stages, volumes } = upstream.storage;
    if (stages.length < 2 || stages.length !== volumes.length) return { height, waterDepth };
    const storage = volumeAt(upstream.storage, stage);
    return {
      height,
      waterDepth,
      storage,
      waterVolume: storage - volumeAt(upstream.storage, bottomLevel),
    };
  }
  if (chainage === null) return { height, waterDepth };
  const storage = poolVolume(sections, chainage, stage);
  return {
    height,
    waterDepth,
    storage,
    waterVolume: storage - poolVolume(sections, chainage, bottomLevel),
  };
}

/** From the crest over the middle of the breach down to its bottom, m; null where one of them is missing. */
export function breachHeightOf({
  offsets,
  levels,
  centre,
  bottomLevel,
}: BreachBody): number | null {
  if (bottomLevel === null || offsets.length < 2 || offsets.length !== levels.length) return null;
  const middle = centre ?? 0.5 * (offsets[0] + offsets[offsets.length - 1]);
  const height = levelAt(crestPoints({ offsets, levels }), middle) - bottomLevel;
  return height > 0 ? height : null;
}

/** The water above the dam when it begins to fail, m; null where it is not known. */
function stageAtFailure(breach: BreachBody, upstream: Upstream): number | null {
  if (breach.trigger === 'stage') return breach.triggerStage;
  return upstream.kind === 'reservoir' ? upstream.initialStage : null;
}

/** What the regressions take; null while heights or volumes are missing. */
export function damInputsOf(breach: BreachBody): DamInputs | null {
  const { dam } = breach;
  const breachHeight = breachHeightOf(breach);
  const { waterDepth, waterVolume } = dam;
  if (breachHeight === null || !isAbove(waterDepth) || !isAbove(waterVolume)) return null;
  return {
    waterDepth,
    breachHeight,
    damHeight: isAbove(dam.height) ? dam.height : breachHeight,
    waterVolume,
    storage: isAbove(dam.storage) ? dam.storage : waterVolume,
    failure: breach.mode,
    embankment: dam.embankment,
    erodibility: dam.erodibility,
    crestWidth: isAbove(dam.crestWidth) ? dam.crestWidth : null,
    faceSlopes: isAbove(dam.faceSlopes) ? dam.faceSlopes : null,
  };
}

const isAbove = (value: number | null): value is number => value !== null && value > 0;

/** Linear between the stages given; held at the ends. */
function volumeAt({ stages, volumes }: ReservoirEnd['storage'], stage: number): number {
  const next = stages.findIndex((value) => value >= stage);
  if (next === 0) return volumes[0];
  if (next < 0) return volumes[volumes.length - 1];
  const share = (stage - stages[next - 1]) / (stages[next] - stages[next - 1]);
  return volumes[next - 1] + share * (volumes[next] - volumes[next - 1]);
}
