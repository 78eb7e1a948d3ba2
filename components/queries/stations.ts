import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { StationBody } from '@/shared/studies/schemas';
import type { Station } from '@/shared/studies/types';
import { api } from './apiClient';

export const stationKeys = {
  list: (studyId: number) => ['stations', studyId] as const,
};

/** Named places of a study, by chainage. */
export const useStations = (studyId: number) =>
  useQuery({
    queryKey: stationKeys.list(studyId),
    queryFn: ({ signal }) => api.get<Station[]>(`/studies/${studyId}/stations`, { signal }),
  });

export function useSaveStation(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    /** Without an id it is a new one. */
    mutationFn: ({ id, ...body }: StationBody & { id?: number }) =>
      id === undefined
        ? api.post<Station>(`/studies/${studyId}/stations`, body)
        : api.patch<Station>(`/stations/${id}`, body),
    onSuccess: () => client.invalidateQueries({ queryKey: stationKeys.list(studyId) }),
  });
}

export function useRemoveStation(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (stationId: number) => api.delete(`/stations/${stationId}`),
    onSuccess: () => client.invalidateQueries({ queryKey: stationKeys.list(studyId) }),
  });
}
