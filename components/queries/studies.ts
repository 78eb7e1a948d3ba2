import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { StudyBody } from '@/shared/studies/schemas';
import type { Study, StudyRow } from '@/shared/studies/types';
import { api } from './apiClient';

export const studyKeys = {
  all: ['studies'] as const,
  list: () => [...studyKeys.all, 'list'] as const,
  one: (studyId: number) => [...studyKeys.all, studyId] as const,
};

export const useStudies = () =>
  useQuery({
    queryKey: studyKeys.list(),
    queryFn: ({ signal }) => api.get<StudyRow[]>('/studies', { signal }),
  });

/** Null: no study to ask for. */
export const useStudy = (studyId: number | null) =>
  useQuery({
    queryKey: studyKeys.one(studyId ?? 0),
    queryFn: ({ signal }) => api.get<Study>(`/studies/${studyId}`, { signal }),
    enabled: studyId !== null,
  });

export function useCreateStudy() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: StudyBody) => api.post<Study>('/studies', body),
    onSuccess: (study) => {
      client.setQueryData(studyKeys.one(study.id), study);
      return client.invalidateQueries({ queryKey: studyKeys.list() });
    },
  });
}

export function useChangeStudy(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: StudyBody) => api.patch<Study>(`/studies/${studyId}`, body),
    onSuccess: (study) => {
      client.setQueryData(studyKeys.one(study.id), study);
      return client.invalidateQueries({ queryKey: studyKeys.list() });
    },
  });
}
