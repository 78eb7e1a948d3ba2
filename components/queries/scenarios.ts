import { useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { ScenarioChange } from '@/shared/scenarios/changeScenario';
import type { ScenarioBody } from '@/shared/scenarios/schemas';
import type { Scenario, ScenarioRow, TableReading } from '@/shared/scenarios/types';
import type { UnitSystem } from '@/shared/units/units';
import { api } from './apiClient';
import { isApiError } from './ApiError';
import { studyKeys } from './studies';

export const scenarioKeys = {
  all: ['scenarios'] as const,
  list: (studyId: number) => [...scenarioKeys.all, 'ofStudy', studyId] as const,
  one: (scenarioId: number) => [...scenarioKeys.all, scenarioId] as const,
};

export const useScenarios = (studyId: number) =>
  useQuery({
    queryKey: scenarioKeys.list(studyId),
    queryFn: ({ signal }) => api.get<ScenarioRow[]>(`/studies/${studyId}/scenarios`, { signal }),
  });

export const useScenario = (scenarioId: number) =>
  useQuery({
    queryKey: scenarioKeys.one(scenarioId),
    queryFn: ({ signal }) => api.get<Scenario>(`/scenarios/${scenarioId}`, { signal }),
  });

export function useCreateScenario(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string; reachId: number }) =>
      api.post<Scenario>(`/studies/${studyId}/scenarios`, body),
    onSuccess: (scenario) => stored(client, studyId, scenario),
  });
}

/** ApiError `conflict` where somebody else saved since `version`: what they saved is then read. */
export function useSaveScenario(studyId: number, scenarioId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: { version: number; body: ScenarioBody }) =>
      api.put<Scenario>(`/scenarios/${scenarioId}`, change),
    onSuccess: (scenario) => stored(client, studyId, scenario),
    onError: (error) =>
      isApiError(error, 'conflict')
        ? client.invalidateQueries({ queryKey: scenarioKeys.one(scenarioId) })
        : undefined,
  });
}

interface DuplicateBody {
  name: string;
  change: ScenarioChange | null;
}

export function useDuplicateScenario(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ scenarioId, ...body }: DuplicateBody & { scenarioId: number }) =>
      api.post<Scenario>(`/scenarios/${scenarioId}/duplicate`, body),
    onSuccess: (scenario) => stored(client, studyId, scenario),
  });
}

/** ApiError `conflict` where it has been run: its runs stand on it. */
export function useRemoveScenario(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scenarioId: number) => api.delete(`/scenarios/${scenarioId}`),
    onSuccess: (_, scenarioId) => {
      client.removeQueries({ queryKey: scenarioKeys.one(scenarioId) });
      return listsChanged(client, studyId);
    },
  });
}

interface TableFile {
  file: File;
  quantity: 'flow' | 'stage';
  unitSystem: UnitSystem;
}

/** Reads a table of values against time from a spreadsheet; stores nothing. */
export function readTable({ file, quantity, unitSystem }: TableFile): Promise<TableReading> {
  const form = new FormData();
  form.append('quantity', quantity);
  form.append('unitSystem', unitSystem);
  form.append('file', file, file.name);
  return api.upload<TableReading>('/tables/read', form);
}

function stored(client: QueryClient, studyId: number, scenario: Scenario) {
  client.setQueryData(scenarioKeys.one(scenario.id), scenario);
  return listsChanged(client, studyId);
}

const listsChanged = (client: QueryClient, studyId: number) =>
  Promise.all([
    client.invalidateQueries({ queryKey: scenarioKeys.list(studyId) }),
    client.invalidateQueries({ queryKey: studyKeys.all }),
  ]);
