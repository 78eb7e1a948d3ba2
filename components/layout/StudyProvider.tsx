import { Redirect } from 'expo-router';
import { useMemo, type ReactNode } from 'react';
import { useStudy } from '../queries/studies';
import { isApiError } from '../queries/ApiError';
import { ErrorState } from '../ui/ErrorState';
import { Loading } from '../ui/Loading';
import { UnitSystemProvider } from '../ui/unitSystem';
import { NotThere } from './NotThere';
import { Screen } from './Screen';
import { mayEnter } from './studyDoors';
import { CurrentStudyContext } from './studyContext';

interface StudyProviderProps {
  studyId: number;
  /** The place of the study that the address names, e.g. `runs`. */
  segment: string | undefined;
  children: ReactNode;
}

/** Reads the study once for all its screens, and sets the units they speak. */
export function StudyProvider({ studyId, segment, children }: StudyProviderProps) {
  const { data: study, error, refetch } = useStudy(Number.isInteger(studyId) ? studyId : null);
  const current = useMemo(
    () =>
      study && { study, may: (action: (typeof study.may)[number]) => study.may.includes(action) },
    [study],
  );

  if (!Number.isInteger(studyId) || isApiError(error, 'notFound')) return <NotThere />;
  if (error && !study) {
    return (
      <Screen title="Study">
        <ErrorState
          error={error}
          title="The study could not be read"
          retry={() => void refetch()}
        />
      </Screen>
    );
  }
  if (!current) {
    return (
      <Screen title="Study">
        <Loading what="Reading the study…" />
      </Screen>
    );
  }
  if (!mayEnter(segment, current.study.may)) return <Redirect href={`/studies/${studyId}`} />;
  return (
    <CurrentStudyContext.Provider value={current}>
      <UnitSystemProvider value={current.study.unitSystem}>{children}</UnitSystemProvider>
    </CurrentStudyContext.Provider>
  );
}
