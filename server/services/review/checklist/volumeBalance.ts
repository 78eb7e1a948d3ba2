import { partsOf, q, say, type Said } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

/** Shares of all water that was there or came in: good below the first, against the rule above the second. */
const GOOD = 0.001;
const BAD = 0.01;

/** Rounding of double precision is told as what it is: nothing. */
const SMALLEST_VOLUME = 0.01;
const SMALLEST_PERCENT = 0.0001;

export const volumeBalance: ChecklistRule = ({ run: { volume } }) => {
  const share = Math.abs(volume.relativeError);
  return {
    id: 'volumeBalance',
    title: 'Volume balance',
    outcome: share < GOOD ? 'good' : share > BAD ? 'bad' : 'look',
    finding: say`${partsOf(amount(volume.error))} unaccounted for, ${percent(share)} % of the water in the reach and what came in.`,
    rule: 'Below 0.1 % is good, above 1 % the run is rejected (common practice).',
  };
};

const amount = (error: number): Said =>
  Math.abs(error) < SMALLEST_VOLUME
    ? say`Less than ${q(SMALLEST_VOLUME, 'volume', { figures: 1 })} is`
    : say`${q(error, 'volume', { figures: 3 })} are`;

const percent = (share: number): string =>
  100 * share < SMALLEST_PERCENT ? `below ${SMALLEST_PERCENT}` : (100 * share).toPrecision(2);
