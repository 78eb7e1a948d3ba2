import { useState } from 'react';
import { useAnnexDownload } from '@/components/queries/verificationCases';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { PAPER_NAMES } from '@/components/screens/reports/reportWords';
import { PAPERS, type Paper } from '@/shared/reports/types';
import type { VerificationList } from '@/shared/verificationCases/types';

/** The cases as pages that go with a report. */
export function AnnexCard({ list }: { list: VerificationList }) {
  const [paper, setPaper] = useState<Paper>('A4');
  const download = useAnnexDownload();
  const results = list.cases.filter(({ result }) => result !== null).length;
  return (
    <Card title="Annex for a report">
      <Txt tone="soft">
        {results === 0
          ? 'Each case with its drawing, its errors and its source on a page. It is made of results: run the cases first.'
          : `Each case with its drawing, its errors and its source on a page: ${results} of ${list.cases.length} have a result.`}
      </Txt>
      <RadioGroup
        label="Paper"
        value={paper}
        options={PAPERS.map((value) => ({ value, label: PAPER_NAMES[value] }))}
        onChange={setPaper}
      />
      <Button
        label={download.isPending ? 'Making the annex…' : 'Annex, PDF'}
        busy={download.isPending}
        disabled={results === 0}
        onPress={() => download.mutate(paper)}
      />
      {download.error ? (
        <ErrorState error={download.error} title="The annex could not be saved" />
      ) : null}
    </Card>
  );
}
