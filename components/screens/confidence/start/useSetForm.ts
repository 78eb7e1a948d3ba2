import { router } from 'expo-router';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useYupForm } from '@/components/forms/useYupForm';
import { useRequestConfidence } from '@/components/queries/confidence';
import { CONFIDENCE_SCHEMAS, type ConfidenceKind } from '@/shared/confidence/schemas';
import type { ConfidenceOptions } from '@/shared/confidence/types';
import type { FormikValues } from 'formik';

export interface SetFormProps {
  runId: number;
  options: ConfidenceOptions;
  stationIds: readonly number[];
}

/** A form that puts a set into the queue and goes to it. */
export function useSetForm<V extends FormikValues>(
  kind: ConfidenceKind,
  { runId, stationIds }: SetFormProps,
  initial: V,
) {
  const { study } = useCurrentStudy();
  const request = useRequestConfidence(runId, kind);
  return useYupForm<V, (typeof CONFIDENCE_SCHEMAS)[ConfidenceKind]>({
    schema: CONFIDENCE_SCHEMAS[kind],
    initial,
    onSubmit: async (body) => {
      const set = await request.mutateAsync({ ...body, stationIds });
      router.push(`/studies/${study.id}/confidence/${set.id}`);
    },
  });
}
