import { useState } from 'react';
import { View } from 'react-native';
import { useReportDownload, useReports } from '@/components/queries/reports';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Checkbox } from '@/components/ui/Checkbox';
import { ErrorState } from '@/components/ui/ErrorState';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { List } from '@/components/ui/List';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Paper } from '@/shared/reports/types';
import type { Run } from '@/shared/runs/types';
import { PAPER_NAMES, reportWords, standingWords } from './reportWords';

/** The report as a PDF on the paper of the place, and those that are kept. */
export function ReportCard({ run }: { run: Run }) {
  const usual: Paper = useUnitSystem() === 'metric' ? 'A4' : 'LETTER';
  const [paper, setPaper] = useState<Paper>(usual);
  const [annex, setAnnex] = useState(false);
  const download = useReportDownload(run.id);
  const { data: reports } = useReports(run.id);
  return (
    <Card title="Report">
      <Txt tone="soft">{standingWords(run.review)}</Txt>
      <RadioGroup
        label="Paper"
        value={paper}
        options={(['A4', 'LETTER'] as const).map((value) => ({ value, label: PAPER_NAMES[value] }))}
        onChange={setPaper}
      />
      <Checkbox label="With the annex of published cases" checked={annex} onChange={setAnnex} />
      <Txt variant="small" tone="soft">
        {'What the solver is worth, as the last pages of the report. It is made of the results on '}
        <LinkTxt variant="small" href="/proof">
          Proof
        </LinkTxt>
        .
      </Txt>
      <Button
        label={download.isPending ? 'Making the report…' : 'Report, PDF'}
        busy={download.isPending}
        onPress={() => download.mutate({ paper, annex })}
      />
      {download.error ? (
        <ErrorState error={download.error} title="The report could not be saved" />
      ) : null}
      {reports?.length ? (
        <List label="Reports kept">
          {reports.map((report) => (
            <View key={report.id}>
              <Txt variant="small">{reportWords(report)}</Txt>
              <Txt variant="caption" tone="soft" style={{ overflowWrap: 'anywhere' } as object}>
                {`SHA-256 ${report.hash}`}
              </Txt>
            </View>
          ))}
        </List>
      ) : null}
    </Card>
  );
}
