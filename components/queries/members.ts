import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { MemberBody } from '@/shared/studies/schemas';
import type { StudyMember } from '@/shared/studies/types';
import { api } from './apiClient';

export const memberKeys = { list: (studyId: number) => ['members', studyId] as const };

/** Surveyors and clients that a study is shared with. */
export const useMembers = (studyId: number) =>
  useQuery({
    queryKey: memberKeys.list(studyId),
    queryFn: ({ signal }) => api.get<StudyMember[]>(`/studies/${studyId}/members`, { signal }),
  });

export function useShareStudy(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: MemberBody) => api.put<StudyMember[]>(`/studies/${studyId}/members`, body),
    onSuccess: (members) => client.setQueryData(memberKeys.list(studyId), members),
  });
}

export function useUnshareStudy(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (userId: number) => api.delete(`/studies/${studyId}/members/${userId}`),
    onSuccess: () => client.invalidateQueries({ queryKey: memberKeys.list(studyId) }),
  });
}
