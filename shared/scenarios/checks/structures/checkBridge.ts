import { crestPoints, lowestOf } from '../../../structures/crests';
import type { BridgeBody } from '../../structures/schemas';
import type { Findings } from '../Findings';
import { checkCoefficient, checkContraction } from './checkCoefficient';
import { checkCrest } from './checkCrest';

export function checkBridge(bridge: BridgeBody, path: string, findings: Findings) {
  const { soffit } = bridge;
  findings.number(
    `${path}.obstructed`,
    bridge.obstructed,
    'Give the share of the flow area that the piers take; 0 without piers.',
    {
      when: (share) => share < 0 || share > 0.5,
      say: 'The share lies between 0 and 0.5; five of a hundred are 0.05.',
    },
  );
  const hasSoffit = findings.number(
    `${path}.soffit`,
    soffit,
    'Give the level of the underside of the deck.',
  );
  checkContraction(findings, `${path}.contraction`, bridge.contraction);
  const hasDeck = checkCrest(findings, path, bridge, null);
  checkCoefficient(findings, `${path}.deckCoefficient`, bridge.deckCoefficient);
  if (hasDeck && hasSoffit && lowestOf(crestPoints(bridge)) < soffit!)
    findings.doubt(
      `${path}.offsets`,
      'The deck lies below its own underside somewhere: water would flow over it before the opening is full.',
    );
}
