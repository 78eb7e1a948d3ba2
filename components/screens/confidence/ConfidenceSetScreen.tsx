import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { isUnderWay, useTaskSet } from '@/components/queries/tasks';
import { Badge } from '@/components/ui/Badge';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { CONFIDENCE_KINDS, type ConfidenceKind } from '@/shared/confidence/schemas';
import type { TaskSet } from '@/shared/tasks/types';
import { confidenceCrumbs, KIND_TITLES, setBadge } from './confidenceWords';
import { MembersCard } from './MembersCard';
import { SetFacts } from './SetFacts';
import { SetProgress } from './SetProgress';
import { StoppedSet } from './StoppedSet';
import { SetResults } from './results/SetResults';

/** One set: how far it is, why it stopped, or what it found. */
export function ConfidenceSetScreen() {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ taskSetId: string }>();
  const id = Number(params.taskSetId);
  const { data: set, error, refetch } = useTaskSet(Number.isInteger(id) ? id : null);
  const isOurs = set?.studyId === study.id && isConfidence(set.kind);
  if (!Number.isInteger(id) || isApiError(error, 'notFound') || (set && !isOurs))
    return <NotThere />;
  if (set?.state === 'finished') return <SetResults set={set} />;
  return (
    <Screen
      title={set?.name ?? 'Set'}
      crumbs={confidenceCrumbs(study, set && KIND_TITLES[set.kind as ConfidenceKind])}
      badge={set ? <Badge {...setBadge(set)} /> : undefined}
    >
      {set ? <Unfinished set={set} /> : null}
      {error && !set ? (
        <ErrorState error={error} title="The set could not be read" retry={() => void refetch()} />
      ) : null}
      {!set && !error ? <Loading what="Reading the set…" /> : null}
    </Screen>
  );
}

function Unfinished({ set }: { set: TaskSet }) {
  return (
    <>
      {isUnderWay(set) ? <SetProgress set={set} /> : <StoppedSet set={set} />}
      <SetFacts set={set} />
      <MembersCard set={set} />
    </>
  );
}

const isConfidence = (kind: string): kind is ConfidenceKind =>
  (CONFIDENCE_KINDS as readonly string[]).includes(kind);
