import { useEffect, useReducer } from 'react';
import { readSurvey, refusedReading, useSendSurvey } from '@/components/queries/surveys';
import type { MatchChoice } from '@/shared/surveys/types';
import { handInReducer, START } from './handInState';

/** Choose, read, look, hand in. Reading again begins whenever the file or the match changes. */
export function useHandIn(studyId: number) {
  const [state, dispatch] = useReducer(handInReducer, START);
  const send = useSendSurvey(studyId);

  useEffect(() => {
    if (state.step !== 'reading') return;
    const { file, choice } = state;
    const stop = new AbortController();
    readSurvey(studyId, { file, match: choice }, stop.signal).then(
      (reading) => dispatch({ type: 'readingArrived', file, choice, reading }),
      (error: Error) => {
        if (!stop.signal.aborted) dispatch({ type: 'readingFailed', file, choice, error });
      },
    );
    return () => stop.abort();
  }, [studyId, state]);

  /** Hands in what was read; a file that is refused shows the faults of that reading. */
  const handIn = async (note: string): Promise<void> => {
    if (state.step !== 'read') return;
    const { file, choice, changed } = state;
    try {
      const row = await send.mutateAsync({ file, match: changed ? choice : null, note });
      dispatch({ type: 'accepted', row });
    } catch (error) {
      const reading = refusedReading(error);
      if (reading) dispatch({ type: 'readingArrived', file, choice, reading });
    }
  };

  return {
    state,
    choose: (file: File) => {
      send.reset();
      dispatch({ type: 'fileChosen', file });
    },
    changeMatch: (choice: MatchChoice) => dispatch({ type: 'matchChanged', choice }),
    readAgain: () => dispatch({ type: 'readAgain' }),
    startAgain: () => {
      send.reset();
      dispatch({ type: 'startedAgain' });
    },
    handIn,
    isSending: send.isPending,
    /** Why it could not be handed in, where it is not the file's fault. */
    sendError: refusedReading(send.error) ? null : send.error,
  };
}

export type HandInControl = ReturnType<typeof useHandIn>;
