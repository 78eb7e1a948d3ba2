import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { isUnderWay, useTaskSet, useTaskSetResult } from '@/components/queries/tasks';
import { Badge } from '@/components/ui/Badge';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import type { SearchResult, SearchSettings } from '@/shared/calibration/search/types';
import { TASK_STATE_WORDS, type TaskSet } from '@/shared/tasks/types';
import { RetrySet } from '../confidence/StoppedSet';
import { SearchProgress } from './SearchProgress';
import { SearchResults } from './SearchResults';

/** A search for roughness: how far it is, then what it found. */
export function SearchScreen() {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ taskSetId: string }>();
  const id = Number(params.taskSetId);
  const { data: set, error, refetch } = useTaskSet(Number.isInteger(id) ? id : null);
  if (!Number.isInteger(id) || isApiError(error, 'notFound')) return <NotThere />;
  if (set && (set.studyId !== study.id || set.kind !== 'calibration')) return <NotThere />;
  if (set) return <Found set={set} />;
  return (
    <Screen title="Search for roughness">
      {error ? (
        <ErrorState
          error={error}
          title="The search could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading the search…" />
      )}
    </Screen>
  );
}

function Found({ set }: { set: TaskSet }) {
  const { study } = useCurrentStudy();
  const result = useTaskSetResult<SearchResult>(set);
  const settings = set.settings as SearchSettings;
  const root = `/studies/${study.id}` as const;
  const head = {
    title: set.name,
    crumbs: [
      { label: study.title, href: root },
      { label: 'Calibration', href: `${root}/calibration` as const },
      ...(set.runId === null
        ? []
        : [
            {
              label: `Run ${set.runNumber}`,
              href: `${root}/calibration/runs/${set.runId}` as const,
            },
          ]),
    ],
    badge: (
      <Badge
        label={TASK_STATE_WORDS[set.state]}
        tone={set.state === 'finished' ? 'moss' : 'soft'}
      />
    ),
  };
  if (result.data)
    return <SearchResults head={head} set={set} settings={settings} result={result.data} />;
  return (
    <Screen {...head}>
      {isUnderWay(set) ? <SearchProgress set={set} settings={settings} /> : null}
      {set.state === 'failed' || set.state === 'cancelled' ? (
        <>
          <Notice
            tone={set.state === 'failed' ? 'danger' : 'info'}
            title={set.state === 'failed' ? 'The search found nothing' : 'The search was cancelled'}
            still
          >
            {set.tasks[0]?.failure ??
              set.failure ??
              'The runs that it had made are kept: going on begins after them.'}
          </Notice>
          <RetrySet set={set} label={set.state === 'failed' ? 'Try again' : 'Go on'} />
        </>
      ) : null}
      {set.state === 'finished' ? (
        result.error ? (
          <ErrorState
            error={result.error}
            title="The result could not be read"
            retry={() => void result.refetch()}
          />
        ) : (
          <Loading what="Reading the result…" />
        )
      ) : null}
    </Screen>
  );
}
