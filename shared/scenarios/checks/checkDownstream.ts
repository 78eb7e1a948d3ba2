import type { ScenarioBody } from '../schemas';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

export function checkDownstream(
  { downstream }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  switch (downstream.kind) {
    case 'normalDepth':
      if (
        findings.number('downstream.slope', downstream.slope, 'Give the slope at the outlet.', {
          when: (slope) => slope <= 0 || slope > 1,
          say: 'The slope lies above 0 and not above 1; 0.001 falls 1 in 1000.',
        }) &&
        downstream.slope! > 0.1
      )
        findings.doubt(
          'downstream.slope',
          'A slope above 0.1 is very steep. Is it fall over length, not in percent?',
        );
      break;
    case 'stage':
      if (
        checkSeries(findings, {
          path: 'downstream',
          names: ['times', 'stages'],
          columns: [downstream.times, downstream.stages],
          missing: 'Give the stage at the outlet against time; one row holds throughout.',
          first: 'Time',
        }) &&
        Math.max(...downstream.stages) <= reach.lastBed
      )
        findings.doubt(
          'downstream.stages',
          say`The stage stays below the bed of the last section, ${q(reach.lastBed, 'elevation')}: water leaves as over a free fall.`,
        );
      break;
    case 'rating':
      checkRating(downstream, reach, findings);
      break;
    case 'wall':
      findings.doubt('downstream.kind', 'No water leaves at the outlet: the reach fills up.');
      break;
    case 'criticalDepth':
    case 'open':
  }
}

function checkRating(
  { stages, flows }: Extract<ScenarioBody['downstream'], { kind: 'rating' }>,
  reach: ReachFacts,
  findings: Findings,
) {
  const sound = checkSeries(findings, {
    path: 'downstream',
    names: ['stages', 'flows'],
    columns: [stages, flows],
    missing: 'Give the flow at the outlet against stage.',
    first: 'Stage',
    least: 2,
    value: (flow) => (flow < 0 ? 'Flow over a rating curve cannot be negative.' : null),
  });
  if (!sound) return;
  for (let i = 1; i < flows.length; i++) {
    if (flows[i] < flows[i - 1]) {
      findings.fault(`downstream.flows[${i}]`, 'Flow falls while the stage rises.');
      return;
    }
  }
  if (flows[flows.length - 1] === 0)
    findings.fault('downstream.flows', 'The curve lets no water out. Use a wall if that is meant.');
  if (stages[stages.length - 1] <= reach.lastBed)
    findings.fault(
      'downstream.stages',
      say`The curve ends below the bed of the last section, ${q(reach.lastBed, 'elevation')}.`,
    );
}
