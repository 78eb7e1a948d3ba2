import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useSurveys } from '@/components/queries/surveys';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { SurveyRevisionRow } from '@/shared/surveys/types';
import { decisionWords } from './decisionWords';
import { HandInCard } from './HandInCard';
import { RefusalsCard } from './RefusalsCard';
import { RevisionsCard } from './RevisionsCard';
import { TemplatesCard } from './TemplatesCard';
import { UnfinishedCard } from './UnfinishedCard';
import type { HandInControl } from './useHandIn';

/** Revisions and refusals, the templates, and the place to hand in a file. */
export function SurveyOverview({ control }: { control: HandInControl }) {
  const { study, may } = useCurrentStudy();
  const surveys = useSurveys(study.id);
  const { isWide } = useBreakpoint();
  const handIn = may('survey.send') ? <HandInCard onFile={control.choose} /> : null;
  const latest = surveys.data?.revisions[0];
  return (
    <Screen
      title="Survey"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      badge={latest ? <Badge label={`Revision ${latest.revision}`} /> : undefined}
      side={
        <>
          {isWide ? handIn : null}
          <TemplatesCard />
        </>
      }
    >
      {control.state.step === 'accepted' ? (
        <Notice
          tone="done"
          title={`${waits(control.state.row) ? 'Handed in' : 'Taken in'} as revision ${control.state.row.revision}`}
        >
          <Txt>
            {control.state.row.sectionCount} sections, {counted(control.state.row.pointCount)}{' '}
            points of {control.state.row.fileName}. This revision will not change; a mended file
            makes the next one.
            {waits(control.state.row)
              ? ' An engineer looks at it now; you are told by mail when it is accepted or returned.'
              : ''}
          </Txt>
          {may('reach.read') && !waits(control.state.row) ? (
            <Button label="Look at the reach" href={`/studies/${study.id}/reach`} />
          ) : null}
        </Notice>
      ) : null}
      {latest?.decision?.decision === 'returned' ? (
        <Notice
          tone="attention"
          title={`Revision ${latest.revision} was returned to be mended`}
          still
        >
          <Txt>{latest.decision.remarks}</Txt>
          <Txt variant="small" tone="soft">
            {decisionWords(latest)}. Mend the file and hand it in again.
          </Txt>
        </Notice>
      ) : null}
      {isWide ? null : handIn}
      {may('survey.send') ? <UnfinishedCard studyId={study.id} /> : null}
      {surveys.isPending ? <Loading what="Reading what was handed in…" /> : null}
      {surveys.isError ? (
        <ErrorState
          title="The surveys could not be read"
          error={surveys.error}
          retry={() => void surveys.refetch()}
        />
      ) : null}
      {surveys.data ? (
        <>
          <RevisionsCard revisions={surveys.data.revisions} />
          <RefusalsCard refusals={surveys.data.refusals} />
        </>
      ) : null}
    </Screen>
  );
}

const waits = ({ decision }: SurveyRevisionRow): boolean => !decision;
const counted = (count: number): string => count.toLocaleString('en-GB');
