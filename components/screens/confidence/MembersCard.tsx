import { useState } from 'react';
import { useMemberCase } from '@/components/queries/confidence';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { TASK_STATE_WORDS, type TaskRow, type TaskSet } from '@/shared/tasks/types';
import { RetrySet } from './StoppedSet';

/** Every member with its state; those that failed say why, and each can be taken away as a case file. */
export function MembersCard({ set }: { set: TaskSet }) {
  const [all, setAll] = useState(false);
  const save = useMemberCase(set.id);
  const failed = set.tasks.filter(({ state }) => state === 'failed');
  const rows = all || set.tasks.length <= FEW ? set.tasks : failed;
  const columns: Column<TaskRow>[] = [
    { key: 'label', title: 'Member', render: ({ label }) => label },
    {
      key: 'state',
      title: 'State',
      render: ({ state, progress }) =>
        state === 'running' ? `Running, ${Math.floor(progress * 100)} %` : TASK_STATE_WORDS[state],
    },
    {
      key: 'case',
      title: 'Case file',
      render: ({ id, label }) => (
        <ButtonRow>
          <Button
            kind="quiet"
            label="Save"
            name={`Save the case file of ${label}`}
            busy={save.isPending && save.variables === id}
            onPress={() => save.mutate(id)}
          />
        </ButtonRow>
      ),
    },
  ];
  return (
    <Card title="Members" aside={`${set.finished} of ${set.total} computed`}>
      {failed.map(({ id, label, failure }) => (
        <Txt key={id} tone="brick">{`${label} failed: ${failure ?? 'no reason was given.'}`}</Txt>
      ))}
      {failed.length > 0 && set.state === 'finished' ? (
        <>
          <Txt variant="small" tone="soft">
            The others are not touched by it. What is told above leaves these out.
          </Txt>
          <RetrySet set={set} label="Try the failed members again" />
        </>
      ) : null}
      {save.error ? (
        <ErrorState error={save.error} title="The case file could not be saved" />
      ) : null}
      {rows.length ? (
        <Table
          label="Members of the set"
          columns={columns}
          rows={rows}
          rowKey={({ id }) => id}
          maxHeight={420}
        />
      ) : null}
      {set.tasks.length > FEW ? (
        <Button
          kind="quiet"
          label={all ? 'Hide the members' : `Show all ${set.total} members`}
          onPress={() => setAll(!all)}
        />
      ) : null}
    </Card>
  );
}

/** Short lists stand open. */
const FEW = 15;
