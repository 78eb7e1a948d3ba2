import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { wallClock } from '@/components/ui/wallClock';
import { settingFacts } from '@/shared/confidence/settingWords';
import type { TaskSet } from '@/shared/tasks/types';

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
