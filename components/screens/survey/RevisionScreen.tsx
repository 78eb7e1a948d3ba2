import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useSurveyRevision } from '@/components/queries/surveys';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SectionsPreview } from './SectionsPreview';
import { wallClock } from '@/components/ui/wallClock';

/** One accepted revision, as it was handed in. */
export function RevisionScreen({ surveyId }: { surveyId: number }) {
  const { study } = useCurrentStudy();
  const { data: survey, error, refetch } = useSurveyRevision(surveyId);
  const here = `/studies/${study.id}/survey` as const;
  return (
    <Screen
      title={survey ? `Revision ${survey.revision}` : 'Revision'}
      crumbs={[
        { label: study.title, href: `/studies/${study.id}` },
        { label: 'Survey', href: here },
      ]}
      lead={
        survey
          ? `${survey.fileName}, sent by ${survey.sentBy} on ${wallClock(survey.sentAt)}. ${survey.note}`
          : undefined
      }
      actions={<Button label="All revisions" href={here} />}
    >
      {error ? (
        <ErrorState
          title="The revision could not be read"
          error={error}
          retry={() => void refetch()}
        />
      ) : survey ? (
        <SectionsPreview sections={survey.sections} />
      ) : (
        <Loading what="Reading the revision…" />
      )}
    </Screen>
  );
}
