import { useCurrentStudy } from '@/components/layout/studyContext';
import { useReportFlood } from '@/components/queries/calibration';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import type { RunResiduals } from '@/shared/calibration/types';
import type { Run } from '@/shared/runs/types';
import { floodName } from './floodWords';

/** Whether the report and the workbook of the run say how it stands against this flood. */
export function ReportedCard({ run, residuals }: { run: Run; residuals: RunResiduals }) {
  const { may } = useCurrentStudy();
  const report = useReportFlood(run.id);
  const { flood, reported } = residuals;
  const isHere = reported === flood;
  return (
    <Card title="In the report">
      <Txt>
        {reported === null
          ? `The report and the workbook of run ${run.number} do not speak of observations yet.`
          : isHere
            ? `The report and the workbook of run ${run.number} compare it with this flood.`
            : `The report and the workbook of run ${run.number} compare it with another flood: ${floodName(reported)}.`}
      </Txt>
      {may('scenario.change') ? (
        <Button
          label={isHere ? 'Leave it out' : 'Put it in'}
          name={isHere ? 'Leave it out of the report' : 'Put it in the report'}
          busy={report.isPending}
          onPress={() => report.mutate(isHere ? null : flood)}
        />
      ) : null}
      {report.error ? <ErrorState error={report.error} title="The report stays as it was" /> : null}
    </Card>
  );
}
