import { useLocalSearchParams } from 'expo-router';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { Screen } from '@/components/layout/Screen';
import { useReach, useReaches } from '@/components/queries/reaches';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { newestReach } from '@/shared/reaches/newestReach';
import { ReachContent } from './ReachContent';

/** The geometry that is routed: the newest reach, or the one that the address names. */
export function ReachScreen() {
  const { study, may } = useCurrentStudy();
  const params = useLocalSearchParams<{ reach?: string }>();
  const reaches = useReaches(study.id);
  const wanted = Number(params.reach);
  const rows = reaches.data ?? [];
  const row = rows.find(({ id }) => id === wanted) ?? newestReach(rows);
  const reach = useReach(row?.id ?? null);

  if (reach.data) return <ReachContent key={reach.data.id} reach={reach.data} reaches={rows} />;
  const error = reaches.error ?? reach.error;
  return (
    <Screen title="Reach" crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}>
      {error ? (
        <ErrorState
          title="The reach could not be read"
          error={error}
          retry={() => void (reaches.error ? reaches : reach).refetch()}
        />
      ) : reaches.data && !row ? (
        <Empty
          title="No reach yet"
          action={
            may('survey.read') ? (
              <Button label="To the survey" kind="solid" href={`/studies/${study.id}/survey`} />
            ) : undefined
          }
        >
          The reach is made of the first survey that is taken in.
        </Empty>
      ) : (
        <Loading what="Reading the sections…" />
      )}
    </Screen>
  );
}
