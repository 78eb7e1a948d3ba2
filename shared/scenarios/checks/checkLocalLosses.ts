import type { ScenarioBody } from '../schemas';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

/** Gradual transitions lose 0.1 and 0.3, bridges 0.3 and 0.5, abrupt ones up to 0.6 and 0.8: common practice. */
const USUAL = { contraction: 0.6, expansion: 0.8 };

export function checkLocalLosses(
  { localLosses = [] }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  localLosses.forEach((loss, i) => {
    const path = `localLosses[${i}]`;
    const outside = {
      when: (chainage: number) => chainage < reach.first || chainage > reach.last,
      say: say`It lies outside the reach, which runs from ${q(reach.first, 'chainage')} to ${q(reach.last, 'chainage')}.`,
    };
    const hasFrom = findings.number(`${path}.from`, loss.from, 'Give where it begins.', outside);
    const hasTo = findings.number(`${path}.to`, loss.to, 'Give where it ends.', outside);
    if (hasFrom && hasTo && loss.to! <= loss.from!)
      findings.fault(`${path}.to`, 'It ends below where it begins; chainage grows downstream.');
    for (const key of ['contraction', 'expansion'] as const) {
      const given = findings.number(`${path}.${key}`, loss[key], 'Give the coefficient.', {
        when: (value) => value < 0 || value > 1,
        say: 'It is a share of the change of velocity head: 0 to 1.',
      });
      if (given && loss[key]! > USUAL[key])
        findings.doubt(
          `${path}.${key}`,
          `Above ${USUAL[key]} even abrupt transitions seldom lose more.`,
        );
    }
  });
}
