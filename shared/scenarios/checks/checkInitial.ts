import type { ScenarioBody } from '../schemas';
import { inflowOf } from '../hydrographs';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

export function checkInitial(body: ScenarioBody, reach: ReachFacts, findings: Findings) {
  const { initial } = body;
  switch (initial.kind) {
    case 'steady':
      checkSteady(body, findings);
      break;
    case 'still':
      findings.number('initial.stage', initial.stage, 'Give the stage of the still water.');
      if (initial.stage !== null && initial.stage <= Math.min(reach.firstBed, reach.lastBed))
        findings.doubt('initial.stage', 'The stage lies below the bed: the reach starts dry.');
      break;
    case 'profile':
      checkProfile(initial, findings);
      break;
    case 'dam':
      checkDam(initial, reach, findings);
  }
}

function checkSteady({ upstream, downstream }: ScenarioBody, findings: Findings) {
  if (downstream.kind === 'wall')
    findings.fault(
      'initial.kind',
      'With a wall at the outlet no flow is steady. Choose another start.',
    );
  if (upstream.kind === 'wall')
    findings.doubt('initial.kind', 'Nothing flows in: steady flow means still or no water.');
  const first = inflowOf(upstream)?.flows[0];
  if (first === 0 && upstream.kind !== 'reservoir')
    findings.doubt(
      'initial.kind',
      'The first inflow is nothing, so the reach starts as good as dry. A small base flow is more like a river.',
    );
}

function checkProfile(
  { chainages, stages, flows }: Extract<ScenarioBody['initial'], { kind: 'profile' }>,
  findings: Findings,
) {
  checkSeries(findings, {
    path: 'initial',
    names: ['chainages', 'stages'],
    columns: [chainages, stages],
    missing: 'Give stage and flow along the reach.',
    first: 'Chainage',
  });
  if (flows.length !== chainages.length)
    findings.fault('initial.flows', 'Every chainage needs its flow; 0 for still water.');
  flows.forEach((flow, i) => {
    if (!Number.isFinite(flow)) findings.fault(`initial.flows[${i}]`, 'Write a number.');
  });
}

function checkDam(
  { chainage, stageAbove, stageBelow }: Extract<ScenarioBody['initial'], { kind: 'dam' }>,
  reach: ReachFacts,
  findings: Findings,
) {
  const hasPlace = findings.number('initial.chainage', chainage, 'Give the chainage of the dam.', {
    when: (at) => at <= reach.first || at >= reach.last,
    say: 'The dam stands within the reach, between its first and its last section.',
  });
  const hasAbove = findings.number(
    'initial.stageAbove',
    stageAbove,
    'Give the stage of the reservoir.',
  );
  if (hasAbove && stageBelow !== null && stageBelow >= stageAbove!)
    findings.fault(
      'initial.stageBelow',
      'The water below the dam stands lower than the reservoir.',
    );
  if (!hasAbove || !hasPlace) return;
  const bed = reach.bedAt(chainage!);
  if (stageAbove! <= bed)
    findings.fault(
      'initial.stageAbove',
      say`The reservoir lies below the bed at the dam, which is at ${q(bed, 'elevation')}.`,
    );
}
