import type { ReservoirInflow, ScenarioBody } from '../schemas';
import { inflowOf, peakOf } from '../hydrographs';
import { checkReservoir } from './checkReservoir';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

/** s; a hundred days, slower than any flood. */
const MAX_TIME_TO_PEAK = 100 * 86_400;

const notNegative = (flow: number) =>
  flow < 0 ? 'Inflow cannot be negative; water is taken out by a lateral.' : null;

export function checkUpstream(
  { upstream, numerics }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  switch (upstream.kind) {
    case 'generated':
    case 'table':
      checkInflow(upstream, 'upstream', findings);
      break;
    case 'reservoir':
      checkReservoir(upstream, reach, findings, (inflow, path) =>
        checkInflow(inflow, path, findings),
      );
      break;
    case 'stage':
      checkSeries(findings, {
        path: 'upstream',
        names: ['times', 'stages'],
        columns: [upstream.times, upstream.stages],
        missing: 'Give the stage at the upstream end against time.',
        first: 'Time',
      });
      if (upstream.stages.length > 0 && Math.max(...upstream.stages) <= reach.firstBed)
        findings.doubt(
          'upstream.stages',
          say`The stage never rises above the bed of the first section, ${q(reach.firstBed, 'elevation')}: no water comes in.`,
        );
      break;
    case 'wall':
      findings.doubt('upstream.kind', 'Nothing flows in at the upstream end.');
  }
  const peak = peakOf(inflowOf(upstream));
  if (peak && numerics.duration !== null && peak.time >= numerics.duration)
    findings.doubt(
      'numerics.duration',
      'The run ends before the inflow reaches its peak. Make it longer, or check the times.',
    );
  // A reservoir can empty itself on a dry day.
  if (peak && peak.flow === 0 && upstream.kind !== 'reservoir')
    findings.doubt('upstream.kind', 'The inflow is nothing throughout.');
}

/** A flood of a shape or as a table, at the reach or at its reservoir. */
function checkInflow(inflow: ReservoirInflow, path: string, findings: Findings) {
  if (inflow.kind === 'generated') return checkGenerated(inflow, path, findings);
  checkSeries(findings, {
    path,
    names: ['times', 'flows'],
    columns: [inflow.times, inflow.flows],
    missing: 'Paste or upload the inflow against time.',
    first: 'Time',
    value: notNegative,
  });
}

function checkGenerated(
  inflow: Extract<ScenarioBody['upstream'], { kind: 'generated' }>,
  path: string,
  findings: Findings,
) {
  const { baseFlow, peakFlow } = inflow;
  const hasBase = findings.number(`${path}.baseFlow`, baseFlow, 'Give the base flow; 0 for none.', {
    when: (flow) => flow < 0,
    say: 'Base flow cannot be negative.',
  });
  const hasPeak = findings.number(`${path}.peakFlow`, peakFlow, 'Give the peak flow.', {
    when: (flow) => flow <= 0,
    say: 'Peak flow is above 0.',
  });
  if (hasBase && hasPeak && peakFlow! < baseFlow!)
    findings.fault(`${path}.peakFlow`, 'The peak includes the base flow and cannot be below it.');
  findings.number(`${path}.timeToPeak`, inflow.timeToPeak, 'Give the time from start to peak.', {
    when: (time) => time <= 0 || time > MAX_TIME_TO_PEAK,
    say: 'Time to peak is above 0 and at most 100 days.',
  });
  if (inflow.shape === 'triangle')
    findings.number(
      `${path}.recessionRatio`,
      inflow.recessionRatio,
      'Give the length of the recession over that of the rise; 1.67 is usual.',
      { when: (ratio) => ratio <= 0 || ratio > 100, say: 'The ratio lies between 0 and 100.' },
    );
  if (inflow.shape === 'gamma')
    findings.number(
      `${path}.gammaExponent`,
      inflow.gammaExponent,
      'Give the exponent of the shape; 3.7 is usual.',
      { when: (m) => m < 0.1 || m > 100, say: 'The exponent lies between 0.1 and 100.' },
    );
}
