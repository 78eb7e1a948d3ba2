import {
  keepPreviousData,
  queryOptions,
  useMutation,
  useQueries,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query';
import { decodeSurface } from '@/shared/runs/surfaceBlock';
import type { AlongQuery } from '@/shared/runs/schemas';
import type {
  Run,
  RunAlong,
  RunReservoirSeries,
  RunRow,
  RunSeries,
  RunStructureSeries,
  RunSummary,
} from '@/shared/runs/types';
import type { Section } from '@/shared/surveys/types';
import { api } from './apiClient';
import { studyKeys } from './studies';

export const runKeys = {
  all: ['runs'] as const,
  list: (studyId: number) => [...runKeys.all, 'ofStudy', studyId] as const,
  one: (runId: number) => [...runKeys.all, runId] as const,
  result: (runId: number, ...part: (string | number)[]) =>
    [...runKeys.one(runId), 'result', ...part] as const,
};

export const isUnfinished = ({ state }: Pick<RunRow, 'state'>): boolean =>
  state === 'queued' || state === 'running';

const LOOK_AGAIN_MS = 3000;

/** Newest first; looked at again while one of them is under way. */
export const useRuns = (studyId: number) =>
  useQuery({
    queryKey: runKeys.list(studyId),
    queryFn: ({ signal }) => api.get<RunRow[]>(`/studies/${studyId}/runs`, { signal }),
    refetchInterval: ({ state }) => (state.data?.some(isUnfinished) ? LOOK_AGAIN_MS : false),
  });

export const useRun = (runId: number | null) =>
  useQuery({
    queryKey: runKeys.one(runId ?? 0),
    queryFn: ({ signal }) => api.get<Run>(`/runs/${runId}`, { signal }),
    enabled: runId !== null,
  });

/** Results of a routed run never change. */
const FIXED = { staleTime: Infinity, gcTime: 10 * 60_000 } as const;

export const useRunSummary = (runId: number) =>
  useQuery({
    queryKey: runKeys.result(runId, 'summary'),
    // Stations may be named after the run: the summary is told anew when it is opened anew.
    queryFn: ({ signal }) => api.get<RunSummary>(`/runs/${runId}/summary`, { signal }),
  });

const seriesQuery = (runId: number, chainage: number) =>
  queryOptions({
    ...FIXED,
    queryKey: runKeys.result(runId, 'series', chainage),
    queryFn: ({ signal }) =>
      api.get<RunSeries>(`/runs/${runId}/series`, { signal, query: { chainage } }),
  });

/** Hazard and arrival along the reach by a threshold, SI; null: none is given. */
export const useRunAlong = (
  runId: number,
  threshold: AlongQuery['threshold'],
  value: number | null,
) =>
  useQuery({
    ...FIXED,
    queryKey: runKeys.result(runId, 'along', threshold, value ?? 'none'),
    queryFn: ({ signal }) =>
      api.get<RunAlong>(`/runs/${runId}/along`, { signal, query: { threshold, value } }),
    enabled: value !== null,
    placeholderData: keepPreviousData,
  });

const surfaceQuery = (runId: number, places: number, moments: number) =>
  queryOptions({
    ...FIXED,
    queryKey: runKeys.result(runId, 'surface', places, moments),
    queryFn: async ({ signal }) =>
      decodeSurface(
        await api.bytes(`/runs/${runId}/surface`, { signal, query: { places, moments } }),
      ),
  });

/** Values against time at a place, m; the last place stays in view until the next has come. */
export const useRunSeries = (runId: number, chainage: number | null) =>
  useQuery({
    ...seriesQuery(runId, chainage ?? 0),
    enabled: chainage !== null,
    placeholderData: keepPreviousData,
  });

/** The whole wave for the long section. */
export const useRunSurface = (runId: number, places: number, moments: number) =>
  useQuery(surfaceQuery(runId, places, moments));

/** The highest water of several runs; null until all are read. */
export function useRunSurfaces(runIds: readonly number[], places: number) {
  const moments = 2;
  return useQueries({
    queries: runIds.map((runId) => surfaceQuery(runId, places, moments)),
    combine: (results) => ({
      surfaces: results.every(({ data }) => data) ? results.map(({ data }) => data!) : null,
      error: results.find(({ error }) => error)?.error ?? null,
      retry: () => void Promise.all(results.map(({ refetch }) => refetch())),
    }),
  });
}

/** Values of several runs at one place; null for a run that does not have it, or until it is read. */
export const useSeriesOfRuns = (runIds: readonly number[], chainage: number) =>
  useQueries({
    queries: runIds.map((runId) => seriesQuery(runId, chainage)),
    combine: (results) => ({
      series: results.map(({ data }) => data ?? null),
      isPending: results.some(({ isPending }) => isPending),
    }),
  });

const structureQuery = (runId: number, structure: number) => ({
  ...FIXED,
  queryKey: runKeys.result(runId, 'structure', structure),
  queryFn: ({ signal }: { signal: AbortSignal }) =>
    api.get<RunStructureSeries>(`/runs/${runId}/structures/${structure}`, { signal }),
});

/** What passes a structure, counted from 1 in the order of the summary. */
export const useRunStructure = (runId: number, structure: number) =>
  useQuery(structureQuery(runId, structure));

/** The same of several; what has not come yet is left out. */
export const useRunStructures = (runId: number, structures: readonly number[]) =>
  useQueries({
    queries: structures.map((structure) => structureQuery(runId, structure)),
    combine: dataOf,
  });
const dataOf = (results: { data?: RunStructureSeries }[]) => results.map(({ data }) => data);

export const useRunReservoir = (runId: number) =>
  useQuery({
    ...FIXED,
    queryKey: runKeys.result(runId, 'reservoir'),
    queryFn: ({ signal }) => api.get<RunReservoirSeries>(`/runs/${runId}/reservoir`, { signal }),
  });

/** The sections as they were frozen with the run: the reach may have changed since. */
export const useRunSections = (runId: number) =>
  useQuery({
    ...FIXED,
    queryKey: runKeys.result(runId, 'sections'),
    queryFn: async ({ signal }) =>
      (await api.get<{ sections: RunSection[] }>(`/runs/${runId}/case.json`, { signal })).sections,
  });

export type RunSection = Pick<Section, 'id' | 'chainage' | 'points' | 'roughness'> & {
  banks?: Section['banks'];
};

/** ApiError `scenarioIncomplete` with the faults where the scenario cannot run. */
export function useRequestRun(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scenarioId: number) => api.post<Run>(`/scenarios/${scenarioId}/runs`),
    onSuccess: (run) => changed(client, studyId, run),
  });
}

export function useCancelRun(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (runId: number) => api.post<Run>(`/runs/${runId}/cancel`),
    onSuccess: (run) => changed(client, studyId, run),
  });
}

export function useRetryRun(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (runId: number) => api.post<Run>(`/runs/${runId}/retry`),
    onSuccess: (run) => changed(client, studyId, run),
  });
}

function changed(client: QueryClient, studyId: number, run: Run) {
  client.setQueryData(runKeys.one(run.id), run);
  return runsChanged(client, studyId);
}

const runsChanged = (client: QueryClient, studyId: number) =>
  Promise.all([
    client.invalidateQueries({ queryKey: runKeys.list(studyId) }),
    client.invalidateQueries({ queryKey: studyKeys.one(studyId) }),
  ]);

/** After the server said that a run has ended. */
export const runEnded = (client: QueryClient, studyId: number, runId: number) =>
  Promise.all([
    client.invalidateQueries({ queryKey: runKeys.one(runId) }),
    runsChanged(client, studyId),
  ]);

export const RUN_FILES = {
  csv: { path: 'results.csv', label: 'Results as CSV' },
  xlsx: { path: 'results.xlsx', label: 'Results as XLSX' },
  levels: { path: 'levels.csv', label: 'Levels as CSV' },
  structures: { path: 'structures.csv', label: 'Structures as CSV' },
  case: { path: 'case.json', label: 'Case file' },
} as const;
export type RunFile = keyof typeof RUN_FILES;

/** Saves a file of the run. */
export const useRunDownload = (runId: number) =>
  useMutation({
    mutationFn: (file: RunFile) => {
      const { path } = RUN_FILES[file];
      return api.download(`/runs/${runId}/${path}`, `run-${runId}-${path}`);
    },
  });
