import { useEffect, useReducer, useState } from 'react';
import { readSurvey, refusedReading, useSendSurvey } from '@/components/queries/surveys';
import { dropFile, type Transfer } from '@/components/queries/uploads';
import type { MatchChoice } from '@/shared/surveys/types';
import { handInReducer, START } from './handInState';

/** Choose, send, read, look, hand in. Reading again begins whenever the file or the match changes. */
export function useHandIn(studyId: number) {
  const [state, dispatch] = useReducer(handInReducer, START);
  const send = useSendSurvey(studyId);
  const [transfer, setTransfer] = useState<Transfer | null>(null);

  useEffect(() => {
    if (state.step !== 'reading') return;
    const { file, choice } = state;
    const stop = new AbortController();
    const options = { signal: stop.signal, onTransfer: setTransfer };
    readSurvey(studyId, { file, match: choice }, options).then(
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

  /** Whoever turns to another file leaves nothing of this one behind. */
  const drop = () => {
    if ('file' in state) dropFile(state.file);
  };

  return {
    state,
    /** While the file travels; null once it has arrived. */
    transfer: transfer && transfer.arrived < transfer.size ? transfer : null,
    choose: (file: File) => {
      drop();
      send.reset();
      setTransfer(null);
      dispatch({ type: 'fileChosen', file });
    },
    changeMatch: (choice: MatchChoice) => dispatch({ type: 'matchChanged', choice }),
    readAgain: () => dispatch({ type: 'readAgain' }),
    startAgain: () => {
      drop();
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
