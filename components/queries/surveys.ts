import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type {
  MatchChoice,
  SurveyList,
  SurveyReading,
  SurveyRevision,
  SurveyRevisionRow,
} from '@/shared/surveys/types';
import type { UnitSystem } from '@/shared/units/units';
import { api } from './apiClient';
import { isApiError } from './ApiError';
import { reachKeys } from './reaches';
import { studyKeys } from './studies';
import { forgetArrived, sendFile, type Transfer } from './uploads';

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

/** Null: none to ask for. */
export const useSurveyRevision = (surveyId: number | null) =>
  useQuery({
    queryKey: surveyKeys.one(surveyId ?? 0),
    queryFn: ({ signal }) => api.get<SurveyRevision>(`/surveys/${surveyId}`, { signal }),
    enabled: surveyId !== null,
  });

interface SurveyFile {
  file: File;
  /** null: as the headings say. */
  match: MatchChoice | null;
  note?: string;
}

/**
 * Hands a file over with `path`, once it has arrived. One that the server has forgotten meanwhile is sent once more.
 */
async function hand<T>(
  studyId: number,
  path: string,
  { file, match, note }: SurveyFile,
  { signal, onTransfer = () => undefined }: { signal?: AbortSignal; onTransfer?: OnTransfer } = {},
): Promise<T> {
  const post = async () => {
    const uploadId = await sendFile(studyId, file, { signal, onTransfer });
    const body = {
      uploadId,
      ...(match && { match: JSON.stringify(match) }),
      ...(note && { note }),
    };
    return api.post<T>(`/studies/${studyId}${path}`, body, { signal });
  };
  try {
    return await post();
  } catch (error) {
    if (!isApiError(error, 'notFound') || !forgetArrived(file)) throw error;
    return post();
  }
}

type OnTransfer = (transfer: Transfer) => void;

/** Reads a file without storing anything of it. */
export const readSurvey = (
  studyId: number,
  file: SurveyFile,
  options: { signal?: AbortSignal; onTransfer?: OnTransfer } = {},
) => hand<SurveyReading>(studyId, '/surveys/read', file, options);

/** Hands a file in: a new revision and its reach, or an ApiError `surveyRefused` whose details are the reading. */
export function useSendSurvey(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (file: SurveyFile) => hand<SurveyRevisionRow>(studyId, '/surveys', file),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: surveyKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: reachKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: studyKeys.all }),
        client.invalidateQueries({ queryKey: ['uploads', studyId] }),
      ]),
  });
}

/** An engineer accepts a revision that was handed in, or returns it with remarks. */
export function useDecideSurvey({ id, studyId }: { id: number; studyId: number }) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { decision: 'accepted' | 'returned'; remarks: string }) =>
      api.post<SurveyRevisionRow>(`/surveys/${id}/decision`, body),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: surveyKeys.one(id) }),
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
        await hand<SurveyRevisionRow>(studyId, '/surveys', file);
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

type TemplatePath = (typeof SURVEY_TEMPLATES)[number]['path'];

/** A workbook in the units of the study. */
export const downloadTemplate = ({ path, units }: { path: TemplatePath; units: UnitSystem }) =>
  api.download(`${path}?units=${units}`, path.slice(path.lastIndexOf('/') + 1));
