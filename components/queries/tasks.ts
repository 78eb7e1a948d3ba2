import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { TaskSet, TaskSetKind, TaskSetRow } from '@/shared/tasks/types';
import { api } from './apiClient';

export const taskSetKeys = {
  all: ['taskSets'] as const,
  list: (studyId: number) => [...taskSetKeys.all, 'ofStudy', studyId] as const,
  one: (taskSetId: number) => [...taskSetKeys.all, taskSetId] as const,
  result: (taskSetId: number, finishedAt: string | null) =>
    [...taskSetKeys.one(taskSetId), 'result', finishedAt] as const,
};

export const isUnderWay = ({ state }: Pick<TaskSetRow, 'state'>): boolean =>
  state === 'queued' || state === 'running';

const LOOK_AGAIN_MS = 1500;

/** Sets of a study, newest first; looked at again while one of them is under way. */
export const useTaskSets = (studyId: number) =>
  useQuery({
    queryKey: taskSetKeys.list(studyId),
    queryFn: ({ signal }) => api.get<TaskSetRow[]>(`/studies/${studyId}/task-sets`, { signal }),
    refetchInterval: ({ state }) => (state.data?.some(isUnderWay) ? LOOK_AGAIN_MS : false),
  });

/** One set with its members; looked at again while it is under way. */
export const useTaskSet = (taskSetId: number | null) =>
  useQuery({
    queryKey: taskSetKeys.one(taskSetId ?? 0),
    queryFn: ({ signal }) => api.get<TaskSet>(`/task-sets/${taskSetId}`, { signal }),
    enabled: taskSetId !== null,
    refetchInterval: ({ state }) => (state.data && isUnderWay(state.data) ? LOOK_AGAIN_MS : false),
  });

/** What a finished set found. It changes only when members are tried again. */
export const useTaskSetResult = <Result>({ id, state, finishedAt }: TaskSetRow) =>
  useQuery({
    queryKey: taskSetKeys.result(id, finishedAt),
    queryFn: ({ signal }) => api.get<Result>(`/task-sets/${id}/result`, { signal }),
    enabled: state === 'finished',
    staleTime: Infinity,
  });

/** Cancels a set, or computes again what failed in it or was cancelled. */
export function useChangeTaskSet(action: 'cancel' | 'retry') {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (taskSetId: number) => api.post<TaskSet>(`/task-sets/${taskSetId}/${action}`),
    onSuccess: (set) => taskSetChanged(client, set),
  });
}

/** After a set was asked for, or its state was changed. */
export function taskSetChanged(client: ReturnType<typeof useQueryClient>, set: TaskSet) {
  client.setQueryData(taskSetKeys.one(set.id), set);
  return set.studyId === null
    ? undefined
    : client.invalidateQueries({ queryKey: taskSetKeys.list(set.studyId) });
}

export const KIND_WORDS: Record<TaskSetKind, string> = {
  convergence: 'Cell-size convergence',
  sensitivity: 'Sensitivity',
  ensemble: 'Ensemble',
  calibration: 'Calibration',
  verification: 'Verification',
};
