import { q, say } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

/** Shares of all water that was there or came in: good below the first, against the rule above the second. */
const GOOD = 0.001;
const BAD = 0.01;

export const volumeBalance: ChecklistRule = ({ run: { volume } }) => {
  const share = Math.abs(volume.relativeError);
  return {
    id: 'volumeBalance',
    title: 'Volume balance',
    outcome: share < GOOD ? 'good' : share > BAD ? 'bad' : 'look',
    finding: say`${q(volume.error, 'volume', { figures: 3 })} are unaccounted for, ${(100 * share).toPrecision(2)} % of the water in the reach and what came in.`,
    rule: 'Below 0.1 % is good, above 1 % the run is rejected (common practice).',
  };
};
