import { useLocalSearchParams } from 'expo-router';
import type { ReactNode } from 'react';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useRun } from '@/components/queries/runs';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run } from '@/shared/runs/types';

interface Props {
  /** Of the screen while the run is read. */
  title: string;
  children: (run: Run) => ReactNode;
}

/** The run that the address names, where it is one of this study. */
export function RunGate({ title, children }: Props) {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ runId: string }>();
  const runId = Number(params.runId);
  const { data: run, error, refetch } = useRun(Number.isInteger(runId) ? runId : null);

  if (!Number.isInteger(runId) || isApiError(error, 'notFound')) return <NotThere />;
  if (run && run.studyId !== study.id) return <NotThere />;
  if (run) return children(run);
  return (
    <Screen title={title}>
      {error ? (
        <ErrorState error={error} title="The run could not be read" retry={() => void refetch()} />
      ) : (
        <Loading what="Reading the run…" />
      )}
    </Screen>
  );
}
