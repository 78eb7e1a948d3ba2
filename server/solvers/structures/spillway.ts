import { createRatingCurve } from '../boundaries/ratingCurve';
import type { Regime, Structure } from './structure';

/** A rated outlet of a reservoir: its flow is known by the stage of the pool alone. */
export function createSpillway(
  rating: { stages: readonly number[]; flows: readonly number[] },
  chainage: number,
): Structure {
  const foot = rating.stages[0];
  const flowAt = createRatingCurve(rating.stages, rating.flows, -Infinity);
  let regime: Regime = 'dry';
  return {
    id: 'spillway',
    kind: 'spillway',
    chainage,
    flow({ stageUp, isForward }) {
      // Below its first stage a rating says nothing, above the pool nothing flows back.
      const flow = isForward && stageUp > foot ? flowAt(stageUp) : 0;
      regime = flow > 0 ? 'rating' : 'dry';
      return flow;
    },
    regime: () => regime,
    lowest: () => foot,
  };
}
