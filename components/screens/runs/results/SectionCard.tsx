import { Card } from '@/components/ui/Card';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { useRunSections } from '@/components/queries/runs';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run, RunSummary } from '@/shared/runs/types';
import { SectionNow } from './SectionNow';
import { useResultSurface } from './useResultSurface';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** The section at the chosen place, once it and the water are read. */
export function SectionCard({ run, summary, store }: Props) {
  const sections = useRunSections(run.id);
  const surface = useResultSurface(run.id);
  const error = sections.error ?? surface.error;
  if (sections.data?.length && surface.data)
    return (
      <SectionNow {...{ run, summary, store }} sections={sections.data} surface={surface.data} />
    );
  return (
    <Card title="Section">
      {error ? (
        <ErrorState
          error={error}
          title="The sections could not be read"
          retry={() => void Promise.all([sections.refetch(), surface.refetch()])}
        />
      ) : (
        <Loading what="Reading the sections…" />
      )}
    </Card>
  );
}
