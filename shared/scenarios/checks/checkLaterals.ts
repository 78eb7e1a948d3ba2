import type { ScenarioBody } from '../schemas';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

export function checkLaterals({ laterals }: ScenarioBody, reach: ReachFacts, findings: Findings) {
  laterals.forEach(({ from, to, times, flows }, i) => {
    const path = `laterals[${i}]`;
    const outside = {
      when: (chainage: number) => chainage < reach.first || chainage > reach.last,
      say: say`It lies outside the reach, which runs from ${q(reach.first, 'chainage')} to ${q(reach.last, 'chainage')}.`,
    };
    const hasFrom = findings.number(
      `${path}.from`,
      from,
      'Give the chainage where it begins.',
      outside,
    );
    const hasTo = findings.number(
      `${path}.to`,
      to,
      'Give the chainage where it ends; the same as its beginning for a point.',
      outside,
    );
    if (hasFrom && hasTo && to! < from!)
      findings.fault(`${path}.to`, 'It ends above its beginning; chainage grows downstream.');
    checkSeries(findings, {
      path,
      names: ['times', 'flows'],
      columns: [times, flows],
      missing: 'Give its flow against time; one row holds throughout.',
      first: 'Time',
    });
    if (flows.some((flow) => flow < 0))
      findings.doubt(`${path}.flows`, 'It takes water out; never more is taken than there is.');
  });
}
