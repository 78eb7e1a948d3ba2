import { useConfirmRead } from '@/components/queries/issued';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { formatDay } from '@/components/ui/formatDay';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { IssuedResult } from '@/shared/review/types';

/** The client says that they read it; the firm sees that. */
export function ConfirmRead({ studyId, result }: { studyId: number; result: IssuedResult }) {
  const confirm = useConfirmRead(studyId);
  if (result.readAt)
    return (
      <Notice tone="done">{`You confirmed on ${formatDay(result.readAt)} that you read this.`}</Notice>
    );
  return (
    <Card title="Have you read it?">
      <Txt>
        Confirm once you have read the report with its limits and cautions. The firm sees that you
        did, and when; nothing else changes.
      </Txt>
      {confirm.error ? <ErrorState error={confirm.error} title="Not confirmed" /> : null}
      <Button
        label="I have read this"
        busy={confirm.isPending}
        onPress={() => confirm.mutate(result.runId)}
      />
    </Card>
  );
}
