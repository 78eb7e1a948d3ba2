import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type {
  MatchChoice,
  SurveyList,
  SurveyReading,
  SurveyRevision,
  SurveyRevisionRow,
} from '@/shared/surveys/types';
import { api } from './apiClient';
import { isApiError } from './ApiError';
import { reachKeys } from './reaches';
import { studyKeys } from './studies';

export const surveyKeys = {
  list: (studyId: number) => ['surveys', 'ofStudy', studyId] as const,
  one: (surveyId: number) => ['surveys', surveyId] as const,
};

/** Accepted revisions and refusals; a surveyor is given their own. */
export const useSurveys = (studyId: number) =>
  useQuery({
    queryKey: surveyKeys.list(studyId),
    queryFn: ({ signal }) => api.get<SurveyList>(`/studies/${studyId}/surveys`, { signal }),
  });

/** Null: none to ask for. A revision never changes, so it is asked for once. */
export const useSurveyRevision = (surveyId: number | null) =>
  useQuery({
    queryKey: surveyKeys.one(surveyId ?? 0),
    queryFn: ({ signal }) => api.get<SurveyRevision>(`/surveys/${surveyId}`, { signal }),
    enabled: surveyId !== null,
    staleTime: Infinity,
  });

interface SurveyFile {
  file: File;
  /** null: as the headings say. */
  match: MatchChoice | null;
  note?: string;
}

function formOf({ file, match, note }: SurveyFile): FormData {
  const form = new FormData();
  // Fields before the file: the server knows the match when the bytes arrive.
  if (match) form.append('match', JSON.stringify(match));
  if (note) form.append('note', note);
  form.append('file', file, file.name);
  return form;
}

/** Reads a file without storing anything of it. */
export const readSurvey = (studyId: number, file: SurveyFile, signal?: AbortSignal) =>
  api.upload<SurveyReading>(`/studies/${studyId}/surveys/read`, formOf(file), { signal });

/** Hands a file in: a new revision and its reach, or an ApiError `surveyRefused` whose details are the reading. */
export function useSendSurvey(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (file: SurveyFile) =>
      api.upload<SurveyRevisionRow>(`/studies/${studyId}/surveys`, formOf(file)),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: surveyKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: reachKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: studyKeys.all }),
      ]),
  });
}

/** The reading that a refusal carries; null where the error is another. */
export const refusedReading = (error: unknown): SurveyReading | null =>
  isApiError(error, 'surveyRefused') ? (error.details as SurveyReading) : null;

/** Hands in a file that was read with faults, so that its refusal is kept. Gives the refusal's id. */
export function useKeepRefusal(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (file: SurveyFile): Promise<number | null> => {
      try {
        await api.upload<SurveyRevisionRow>(`/studies/${studyId}/surveys`, formOf(file));
        return null;
      } catch (error) {
        if (!isApiError(error, 'surveyRefused')) throw error;
      }
      const { refusals } = await client.fetchQuery({
        queryKey: surveyKeys.list(studyId),
        queryFn: () => api.get<SurveyList>(`/studies/${studyId}/surveys`),
        staleTime: 0,
      });
      return refusals.find(({ fileName }) => fileName === file.file.name)?.id ?? null;
    },
  });
}

export const downloadFaults = (refusalId: number) =>
  api.download(`/refusals/${refusalId}/faults.xlsx`, 'faults.xlsx');

export const SURVEY_TEMPLATES = [
  { path: '/templates/survey.xlsx', label: 'Blank template' },
  { path: '/templates/survey-example.xlsx', label: 'Filled example, one long table' },
  { path: '/templates/survey-sections-example.xlsx', label: 'Filled example, one sheet a section' },
] as const;

export const downloadTemplate = (path: (typeof SURVEY_TEMPLATES)[number]['path']) =>
  api.download(path, path.slice(path.lastIndexOf('/') + 1));
