import type { MarksOptions } from '../../shared/calibration/readMarks';
import type { MarksReading } from '../../shared/calibration/types';
import type { TableOptions } from '../../shared/scenarios/pasteTable';
import type { TableReading } from '../../shared/scenarios/types';
import type { SurveyReading } from '../../shared/surveys/types';
import type { SurveyReadingOptions } from './survey/readSurvey';

/** What can be read in a worker: the kind of file, and how. */
export type ImportTask =
  | { kind: 'survey'; options: SurveyReadingOptions }
  | { kind: 'table'; options: TableOptions & { fileName: string } }
  | { kind: 'marks'; options: MarksOptions & { fileName: string } };

export interface ImportResults {
  survey: SurveyReading;
  table: TableReading;
  marks: MarksReading;
}

/** What the worker answers. */
export type ImportAnswer =
  | { ok: true; reading: ImportResults[keyof ImportResults] }
  | { ok: false; code: 'unreadable' | 'tooLarge' | 'timeout'; message: string }
  | { ok: false; code: 'internal'; message: string };
