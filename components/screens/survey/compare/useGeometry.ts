import { useReach } from '@/components/queries/reaches';
import { useSurveyRevision } from '@/components/queries/surveys';
import type { GeometryKey } from './geometryChoice';

/** The sections of a survey revision or a reach; null: none to ask for. */
export function useGeometry(key: GeometryKey | null) {
  const survey = useSurveyRevision(key?.kind === 'survey' ? key.id : null);
  const reach = useReach(key?.kind === 'reach' ? key.id : null);
  const query = key?.kind === 'reach' ? reach : survey;
  return {
    sections: key ? query.data?.sections : undefined,
    error: query.error,
    refetch: query.refetch,
  };
}
