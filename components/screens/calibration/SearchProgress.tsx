import { useChangeTaskSet } from '@/components/queries/tasks';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Txt } from '@/components/ui/Txt';
import type { SearchSettings } from '@/shared/calibration/search/types';
import type { TaskSet } from '@/shared/tasks/types';
import { timeLeftWords } from '../runs/runWords';

/** How far a search is, of the runs that it may take. */
export function SearchProgress({ set, settings }: { set: TaskSet; settings: SearchSettings }) {
  const cancel = useChangeTaskSet('cancel');
  const queued = set.state === 'queued';
  return (
    <Card title="Under way">
      <FigureWithUnit
        value={queued ? 'Queued' : String(Math.min(99, Math.floor(set.progress * 100)))}
        unit={queued ? undefined : '%'}
        label={
          queued
            ? 'Waiting for a free place to compute'
            : `of at most ${settings.evaluations + 4 * settings.stretches.length} runs, ${timeLeftWords(set.secondsLeft)}`
        }
        size="display"
      />
      <Txt tone="soft">
        It often ends sooner, when better multipliers are no longer found. You can leave: it goes on
        without you, and after an interruption from the runs that it had made.
      </Txt>
      {set.may.includes('taskSet.cancel') ? (
        <Button
          kind="danger"
          label="Cancel the search"
          busy={cancel.isPending}
          onPress={() => cancel.mutate(set.id)}
        />
      ) : null}
      {cancel.error ? <ErrorState error={cancel.error} title="The search goes on" /> : null}
    </Card>
  );
}
