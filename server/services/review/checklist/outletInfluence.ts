import { partsOf, q, say } from '../../../../shared/units/message';
import { fine, widest, type ChecklistRule } from './types';

/** m at the place where the two runs differ most. */
const GOOD = 0.02;
const BAD = 0.1;
const TITLE = 'Reach of the outlet condition';
const RULE = say`The outlet condition should not reach the places that are asked for: below ${q(GOOD, 'depth')} is good, above ${q(BAD, 'depth')} it does (common practice).`;

export const outletInfluence: ChecklistRule = ({ probe, caseFile }) => {
  const item = { id: 'outletInfluence', title: TITLE, rule: RULE };
  if (caseFile.downstream.kind === 'wall')
    return {
      ...item,
      outcome: 'look',
      finding: 'The downstream end is closed: water is held up by it.',
    };
  const most = probe && probe.state === 'routed' ? widest(probe.peaks) : null;
  if (!probe || !most) {
    const finding = !probe
      ? 'Not tried. Ask for a second run with a changed outlet, or say why it does not matter.'
      : say`Run ${probe.runNumber} with ${partsOf(probe.change)} is ${probe.state}.`;
    return { ...item, outcome: 'asked', finding };
  }
  return {
    ...item,
    outcome: most.difference < GOOD ? 'good' : most.difference > BAD ? 'bad' : 'look',
    finding: say`Run ${probe.runNumber} with ${partsOf(probe.change)} moves the peak stage by at most ${fine(most.difference)}, at ${most.name}.`,
  };
};
