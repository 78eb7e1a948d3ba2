import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { wallClock } from '@/components/ui/wallClock';
import { PARAMETERS } from '@/shared/confidence/parameters';
import { valueWords } from '@/shared/confidence/planMembers';
import type {
  EnsembleSettings,
  SensitivitySettings,
  SettingsOf,
} from '@/shared/confidence/schemas';
import type { TaskSet } from '@/shared/tasks/types';
import { formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { distributionWords } from './confidenceWords';

/** What was asked for, of which case, by which solver: enough to make it again. */
export function SetFacts({ set }: { set: TaskSet }) {
  const system = useUnitSystem();
  return (
    <Card title="What was computed">
      {set.runId !== null ? (
        <Txt>
          {'The frozen case of '}
          <LinkTxt
            href={`/studies/${set.studyId!}/runs/${set.runId}`}
          >{`run ${set.runNumber}`}</LinkTxt>
          {', varied as follows. The run itself stays as it is.'}
        </Txt>
      ) : null}
      <Facts
        facts={[
          ...settingFacts(set, system),
          ['Asked for', `by ${set.requestedBy}, ${wallClock(set.requestedAt)}`],
          ['Finished', set.finishedAt && wallClock(set.finishedAt)],
          ['Solver', set.solverVersion],
          ['Case', set.caseHash],
        ]}
      />
    </Card>
  );
}

function settingFacts(set: TaskSet, system: UnitSystem): [string, string | null][] {
  if (set.kind === 'convergence') {
    const { finest } = set.settings as SettingsOf['convergence'];
    return [
      ['Finest grid', finest === 'half' ? 'half the cells of the run' : 'the cells of the run'],
    ];
  }
  if (set.kind === 'sensitivity') {
    const { cellSize, parameters } = set.settings as SensitivitySettings;
    return [
      ...parameters.map(({ key, low, high }): [string, string] => [
        PARAMETERS[key].label,
        `${valueWords(key, low)} and ${valueWords(key, high)}`,
      ]),
      ['Cells', cellWords(cellSize, system)],
    ];
  }
  const { cellSize, members, parameters, seed } = set.settings as EnsembleSettings;
  return [
    ['Sampling', `Latin hypercube, ${members} members, seed ${seed}`],
    ...parameters.map(({ key, distribution }): [string, string] => [
      PARAMETERS[key].label,
      `${distributionWords(distribution)}${PARAMETERS[key].measure === 'metres' ? ' (m, added)' : ' (multiplies)'}`,
    ]),
    ['Cells', cellWords(cellSize, system)],
  ];
}

const cellWords = (cellSize: number | null, system: UnitSystem): string =>
  cellSize === null
    ? 'those of the run'
    : `${formatWithUnit(cellSize, 'length', system)}, chosen for the members`;
