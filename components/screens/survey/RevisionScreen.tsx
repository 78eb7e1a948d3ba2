import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useSurveyRevision } from '@/components/queries/surveys';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SectionsPreview } from './SectionsPreview';
import { Badge } from '@/components/ui/Badge';
import { Notice } from '@/components/ui/Notice';
import { wallClock } from '@/components/ui/wallClock';
import type { SurveyRevisionRow } from '@/shared/surveys/types';
import { DecisionCard } from './DecisionCard';
import { decisionWords } from './decisionWords';

/** One revision, as it was handed in, and where it stands. */
export function RevisionScreen({ surveyId }: { surveyId: number }) {
  const { study, may } = useCurrentStudy();
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
      badge={survey ? <Badge {...badgeOf(survey)} /> : undefined}
      side={
        survey && may('survey.decide') && survey.decision?.decision !== 'accepted' ? (
          <DecisionCard survey={survey} />
        ) : undefined
      }
    >
      {error ? (
        <ErrorState
          title="The revision could not be read"
          error={error}
          retry={() => void refetch()}
        />
      ) : survey ? (
        <>
          {survey.decision?.remarks ? (
            <Notice
              still
              tone={survey.decision.decision === 'returned' ? 'attention' : 'info'}
              title={decisionWords(survey)}
            >
              {survey.decision.remarks}
            </Notice>
          ) : null}
          <SectionsPreview sections={survey.sections} />
        </>
      ) : (
        <Loading what="Reading the revision…" />
      )}
    </Screen>
  );
}

function badgeOf({ decision }: SurveyRevisionRow) {
  if (!decision) return { label: 'Waits for an engineer', tone: 'ochre' } as const;
  return decision.decision === 'accepted'
    ? ({ label: 'Accepted', tone: 'moss' } as const)
    : ({ label: 'Returned', tone: 'ochre' } as const);
}
