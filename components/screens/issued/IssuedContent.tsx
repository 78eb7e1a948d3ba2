import { useState } from 'react';
import { Screen } from '@/components/layout/Screen';
import { useIssuedReport } from '@/components/queries/issued';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { formatDay } from '@/components/ui/formatDay';
import { SelectField } from '@/components/ui/SelectField';
import type { IssuedResult } from '@/shared/review/types';
import type { Study } from '@/shared/studies/types';
import { IssuedFlood } from './IssuedFlood';
import { IssuedWithdrawn } from './IssuedWithdrawn';

interface Props {
  study: Study;
  issued: IssuedResult[];
  crumbs: Parameters<typeof Screen>[0]['crumbs'];
  isClient: boolean;
}

/** One issued result; where there are several, the newest first and the others to be chosen. */
export function IssuedContent({ study, issued, crumbs, isClient }: Props) {
  const [runId, setRunId] = useState(issued[0].runId);
  const report = useIssuedReport();
  const result = issued.find((each) => each.runId === runId) ?? issued[0];
  return (
    <Screen
      title={study.title}
      crumbs={crumbs}
      badge={result.withdrawn ? <Badge label="Withdrawn" tone="brick" /> : null}
      lead={result.title.replace(`${study.title}: `, '')}
      actions={
        <Button
          kind={result.withdrawn ? 'outline' : 'solid'}
          label="Read the report, PDF"
          busy={report.isPending}
          onPress={() => report.mutate(result.runId)}
        />
      }
    >
      {report.error ? (
        <ErrorState error={report.error} title="The report could not be read" />
      ) : null}
      {issued.length > 1 ? (
        <SelectField
          label="Result"
          value={String(result.runId)}
          options={issued.map((each) => ({
            value: String(each.runId),
            label: `${each.title}, signed ${formatDay(each.signedAt)}${each.withdrawn ? ', withdrawn' : ''}`,
          }))}
          onChange={(value) => setRunId(Number(value))}
        />
      ) : null}
      {result.withdrawn ? (
        <IssuedWithdrawn result={result} withdrawn={result.withdrawn} />
      ) : (
        <IssuedFlood key={result.runId} study={study} result={result} isClient={isClient} />
      )}
    </Screen>
  );
}
