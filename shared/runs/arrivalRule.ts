import type { ArrivalThreshold } from '../case/resultFile';
import { q, say, type Said } from '../units/message';

/** The rule by which a run told arrival: its own words in SI, the same with its quantities for other units. */
export const arrivalRule = ({ text, rise, depth }: ArrivalThreshold): Said => ({
  ...say`The wave has arrived when the stage is ${q(rise, 'depth')} above its initial value; where it was dry, when the water is ${q(depth, 'depth')} deep.`,
  message: text,
});
