import { useChangeTaskSet } from '@/components/queries/tasks';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { ProgressBar } from '@/components/ui/ProgressBar';
import { Txt } from '@/components/ui/Txt';
import type { TaskSet } from '@/shared/tasks/types';
import { timeLeftWords } from '../runs/runWords';

/** A set that is queued or computing, and the way to stop it. */
export function SetProgress({ set }: { set: TaskSet }) {
  const cancel = useChangeTaskSet('cancel');
  const queued = set.state === 'queued';
  const percent = Math.min(99, Math.floor(set.progress * 100));
  const done = set.finished + set.failed;
  const words = queued
    ? 'Runs go first; then sets take turns.'
    : `${done} of ${set.total} members computed${set.failed ? `, ${set.failed} of them failed` : ''}; ${timeLeftWords(set.secondsLeft)}`;
  return (
    <Card title="Computing">
      <FigureWithUnit
        value={queued ? 'Queued' : String(percent)}
        unit={queued ? undefined : '%'}
        label={words}
        size="display"
      />
      <ProgressBar label="Progress of the set" share={queued ? 0 : percent / 100} />
      {cancel.error ? (
        <ErrorState error={cancel.error} title="The set could not be cancelled" />
      ) : null}
      {set.may.includes('taskSet.cancel') ? (
        <Button
          label="Cancel the set"
          kind="danger"
          busy={cancel.isPending}
          onPress={() => cancel.mutate(set.id)}
        />
      ) : null}
      <Txt variant="small" tone="soft">
        It goes on when this page is closed.
      </Txt>
    </Card>
  );
}
