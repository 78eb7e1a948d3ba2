import type { ScenarioBody } from '../schemas';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

/** Factors beyond these are no calibration but a slip of the pen; the case file holds to the same. */
const LEAST = 0.1;
const MOST = 10;
/** Beyond these a multiplier says that the roughness itself should be looked at. */
const USUAL = { least: 0.5, most: 2 };

export function checkRoughness(
  { roughnessFactors = [] }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  roughnessFactors.forEach(({ from, to, depths, factors }, i) => {
    const path = `roughnessFactors[${i}]`;
    const outside = {
      when: (chainage: number) => chainage < reach.first || chainage > reach.last,
      say: say`It lies outside the reach, which runs from ${q(reach.first, 'chainage')} to ${q(reach.last, 'chainage')}.`,
    };
    const hasFrom = findings.number(`${path}.from`, from, 'Give where it begins.', outside);
    const hasTo = findings.number(`${path}.to`, to, 'Give where it ends.', outside);
    if (hasFrom && hasTo && to! <= from!)
      findings.fault(`${path}.to`, 'It ends below where it begins; chainage grows downstream.');
    checkSeries(findings, {
      path,
      names: ['depths', 'factors'],
      columns: [depths, factors],
      missing: 'Give the multiplier of Manning’s n; one row holds at every depth.',
      first: 'Depth',
      value: (factor) =>
        factor < LEAST || factor > MOST ? `A multiplier lies between ${LEAST} and ${MOST}.` : null,
    });
    if (depths.some((depth) => depth < 0))
      findings.fault(`${path}.depths`, 'A depth cannot be negative.');
    if (factors.some((factor) => factor < USUAL.least || factor > USUAL.most))
      findings.doubt(
        `${path}.factors`,
        `A multiplier below ${USUAL.least} or above ${USUAL.most} asks whether the roughness, the sections or the flow are right.`,
      );
  });
}
