import { useChangeTaskSet } from '@/components/queries/tasks';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { TaskSet } from '@/shared/tasks/types';

/** A set that was cancelled, or came to nothing: why, and what to do next. */
export function StoppedSet({ set }: { set: TaskSet }) {
  const failed = set.state === 'failed';
  return (
    <>
      <Notice
        tone={failed ? 'danger' : 'info'}
        title={failed ? 'The set gave no result' : 'The set was cancelled'}
        still
      >
        <Txt>
          {failed
            ? (set.failure ?? 'No reason was given.')
            : `${set.finished} of ${set.total} members had been computed and are kept.${set.may.includes('taskSet.retry') ? ' Going on computes the others.' : ''}`}
        </Txt>
      </Notice>
      <RetrySet set={set} label={failed ? 'Try again' : 'Go on'} />
    </>
  );
}

/** Computes again what failed or was cancelled, or says why that is not done. */
export function RetrySet({ set, label }: { set: TaskSet; label: string }) {
  const retry = useChangeTaskSet('retry');
  if (set.whyNoRetry) return <Txt tone="soft">{set.whyNoRetry}</Txt>;
  if (!set.may.includes('taskSet.retry')) return null;
  return (
    <>
      {retry.error ? (
        <ErrorState error={retry.error} title="The set could not be put into the queue" />
      ) : null}
      <Button label={label} busy={retry.isPending} onPress={() => retry.mutate(set.id)} />
    </>
  );
}
