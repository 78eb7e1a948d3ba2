import type { MatchChoice, SurveyReading, SurveyRevisionRow } from '@/shared/surveys/types';
import { choiceOf } from './matchChoice';

/** Handing in a survey: choose a file, look at what was read of it, give it in. */
export type HandIn =
  | { step: 'choose' }
  | { step: 'reading'; file: File; choice: MatchChoice | null; previous: SurveyReading | null }
  | { step: 'unread'; file: File; choice: MatchChoice | null; error: Error }
  | { step: 'read'; file: File; choice: MatchChoice; changed: boolean; reading: SurveyReading }
  | { step: 'accepted'; row: SurveyRevisionRow };

export type HandInAction =
  | { type: 'fileChosen'; file: File }
  | { type: 'matchChanged'; choice: MatchChoice }
  | { type: 'readAgain' }
  | { type: 'readingArrived'; file: File; choice: MatchChoice | null; reading: SurveyReading }
  | { type: 'readingFailed'; file: File; choice: MatchChoice | null; error: Error }
  | { type: 'accepted'; row: SurveyRevisionRow }
  | { type: 'startedAgain' };

export const START: HandIn = { step: 'choose' };

export function handInReducer(state: HandIn, action: HandInAction): HandIn {
  switch (action.type) {
    case 'fileChosen':
      return { step: 'reading', file: action.file, choice: null, previous: null };
    case 'matchChanged':
      return state.step === 'read'
        ? {
            step: 'reading',
            file: state.file,
            choice: action.choice,
            previous: state.reading,
          }
        : state.step === 'reading'
          ? { ...state, choice: action.choice }
          : state;
    case 'readAgain':
      return state.step === 'unread'
        ? { step: 'reading', file: state.file, choice: state.choice, previous: null }
        : state;
    case 'readingArrived': {
      if (!awaits(state, action)) return state;
      const { reading, file, choice } = action;
      return {
        step: 'read',
        file,
        choice: choice ?? choiceOf(reading.sheets, 'auto'),
        changed: choice !== null,
        reading,
      };
    }
    case 'readingFailed':
      return awaits(state, action)
        ? { step: 'unread', file: action.file, choice: action.choice, error: action.error }
        : state;
    case 'accepted':
      return { step: 'accepted', row: action.row };
    case 'startedAgain':
      return START;
  }
}

/** An answer about another file or an older choice comes too late to count. */
const awaits = (
  state: HandIn,
  { file, choice }: { file: File; choice: MatchChoice | null },
): boolean =>
  (state.step === 'reading' && state.file === file && state.choice === choice) ||
  // A refusal on handing in is a new reading of what stands there.
  (state.step === 'read' && state.file === file);

/** Faults that refuse the file; doubts do not. */
export const refuses = (reading: SurveyReading): boolean =>
  reading.faultsNotListed > 0 || reading.faults.some(({ severity }) => severity === 'fault');
