import { useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { GaugeBody, MarkBody } from '@/shared/calibration/schemas';
import type { Gauge, Mark, MarksReading, Observations } from '@/shared/calibration/types';
import { api } from './apiClient';
import { runKeys } from './runs';

export const observationKeys = {
  all: ['observations'] as const,
  list: (studyId: number) => [...observationKeys.all, 'ofStudy', studyId] as const,
  gauge: (gaugeId: number) => [...observationKeys.all, 'gauge', gaugeId] as const,
};

/** Marks and gauge records of a study, by chainage. */
export const useObservations = (studyId: number) =>
  useQuery({
    queryKey: observationKeys.list(studyId),
    queryFn: ({ signal }) => api.get<Observations>(`/studies/${studyId}/observations`, { signal }),
  });

export const useGauge = (gaugeId: number | null) =>
  useQuery({
    queryKey: observationKeys.gauge(gaugeId ?? 0),
    queryFn: ({ signal }) => api.get<Gauge>(`/gauges/${gaugeId}`, { signal }),
    enabled: gaugeId !== null,
  });

export function useAddMarks(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (marks: MarkBody[]) => api.post<Mark[]>(`/studies/${studyId}/marks`, { marks }),
    onSuccess: () => changed(client),
  });
}

export function useChangeMark() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...body }: MarkBody & { id: number }) =>
      api.patch<Mark>(`/marks/${id}`, body),
    onSuccess: () => changed(client),
  });
}

export function useRemoveMark() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (markId: number) => api.delete(`/marks/${markId}`),
    onSuccess: () => changed(client),
  });
}

export function useSaveGauge(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    /** Without an id it is a new one. */
    mutationFn: ({ id, ...body }: GaugeBody & { id?: number }) =>
      id === undefined
        ? api.post<Gauge>(`/studies/${studyId}/gauges`, body)
        : api.put<Gauge>(`/gauges/${id}`, body),
    onSuccess: () => changed(client),
  });
}

export function useRemoveGauge() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (gaugeId: number) => api.delete(`/gauges/${gaugeId}`),
    onSuccess: () => changed(client),
  });
}

/** Reads marks from a spreadsheet; stores nothing. */
export function readMarkFile(studyId: number, file: File, flood: string): Promise<MarksReading> {
  const form = new FormData();
  form.append('flood', flood);
  form.append('file', file, file.name);
  return api.upload<MarksReading>(`/studies/${studyId}/marks/read`, form);
}

/** What was observed stands beside every run. */
const changed = (client: QueryClient) =>
  Promise.all([
    client.invalidateQueries({ queryKey: observationKeys.all }),
    client.invalidateQueries({ queryKey: runKeys.all }),
  ]);
