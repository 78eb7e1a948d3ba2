import { useCaseValuesDownload } from '@/components/queries/verificationCases';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Facts } from '@/components/ui/Facts';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';
import type { VerificationCaseRow } from '@/shared/verificationCases/types';

/** Source, what the case shows and what it does not, and who computed it when. */
export function AboutCard({ row }: { row: VerificationCaseRow }) {
  const { result } = row;
  const download = useCaseValuesDownload(row.id);
  return (
    <>
      <Card title="Source">
        <Txt>{row.source}</Txt>
      </Card>
      <Card title="What it shows">
        <Txt>{row.shows}</Txt>
        <Txt strong>What it does not show</Txt>
        <Txt>{row.doesNotShow}</Txt>
      </Card>
      {result ? (
        <Card title="Computed">
          <Facts
            facts={[
              ['When', wallClock(result.computedAt)],
              ['Solver', result.isCurrent ? result.solver : `${result.solver}, an older one`],
              ['Asked for by', result.requestedBy],
              ['Computing', `${result.seconds.toFixed(1)} s, all grids`],
            ]}
          />
          <Button label="Values, CSV" busy={download.isPending} onPress={() => download.mutate()} />
          {download.error ? (
            <ErrorState error={download.error} title="The values could not be saved" />
          ) : null}
        </Card>
      ) : null}
    </>
  );
}
