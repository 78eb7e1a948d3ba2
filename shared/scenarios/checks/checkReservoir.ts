import type { ReservoirEnd, ReservoirInflow } from '../schemas';
import { checkSeries } from './checkSeries';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { q, say } from '../../units/message';

/** The level pool at the head of the reach: storage, stage at the start, inflow, spillway. */
export function checkReservoir(
  { storage, initialStage, inflow, spillway }: ReservoirEnd,
  reach: ReachFacts,
  findings: Findings,
  checkInflow: (inflow: ReservoirInflow, path: string) => void,
) {
  const { stages, volumes } = storage;
  const hasStorage = checkSeries(findings, {
    path: 'upstream.storage',
    names: ['stages', 'volumes'],
    columns: [stages, volumes],
    missing: 'Paste or upload the storage of the reservoir against stage.',
    first: 'Stage',
    least: 2,
    value: (volume) => (volume < 0 ? 'A volume cannot be negative.' : null),
  });
  const falls = volumes.findIndex((volume, i) => i > 0 && volume <= volumes[i - 1]);
  if (hasStorage && falls > 0)
    findings.fault(`upstream.storage.volumes[${falls}]`, 'The volume must grow with the stage.');
  const hasStage = findings.number(
    'upstream.initialStage',
    initialStage,
    'Give the stage of the reservoir at the start.',
    {
      when: (stage) => hasStorage && (stage < stages[0] || stage > stages[stages.length - 1]),
      say: 'It lies outside the stages of the storage table. Extend the table, or mend the stage.',
    },
  );
  if (hasStage && initialStage! < reach.firstBed)
    findings.doubt(
      'upstream.initialStage',
      say`The reservoir stands below the bed of the first section, ${q(reach.firstBed, 'elevation')}. Are both of one datum?`,
    );
  checkInflow(inflow, 'upstream.inflow');
  if (spillway.stages.length + spillway.flows.length > 0) checkSpillway(spillway, findings);
}

function checkSpillway({ stages, flows }: ReservoirEnd['spillway'], findings: Findings) {
  const sound = checkSeries(findings, {
    path: 'upstream.spillway',
    names: ['stages', 'flows'],
    columns: [stages, flows],
    missing: 'Give the flow of the spillway against stage.',
    first: 'Stage',
    least: 2,
    value: (flow) => (flow < 0 ? 'Flow over a spillway cannot be negative.' : null),
  });
  const falls = flows.findIndex((flow, i) => i > 0 && flow < flows[i - 1]);
  if (sound && falls > 0)
    findings.fault(`upstream.spillway.flows[${falls}]`, 'Flow falls while the stage rises.');
}
