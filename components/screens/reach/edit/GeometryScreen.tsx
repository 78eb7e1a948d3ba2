import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useReach } from '@/components/queries/reaches';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { GeometryEditing } from './GeometryEditing';

/** One working geometry, open to be changed; the reach of a survey says that it is none. */
export function GeometryScreen() {
  const { study, may } = useCurrentStudy();
  const { reachId } = useLocalSearchParams<{ reachId: string }>();
  const { data: reach, error, refetch } = useReach(Number(reachId));
  const isWorking = reach?.copiedFrom != null;
  if (reach && isWorking && may('reach.change'))
    return <GeometryEditing key={reach.id} reach={reach} />;
  if (isApiError(error, 'notFound')) return <NotThere />;
  return (
    <Screen
      title={reach?.name ?? 'Working geometry'}
      crumbs={[
        { label: study.title, href: `/studies/${study.id}` },
        { label: 'Reach', href: `/studies/${study.id}/reach` },
      ]}
    >
      {error ? (
        <ErrorState
          title="The geometry could not be read"
          error={error}
          retry={() => void refetch()}
        />
      ) : reach ? (
        <Empty
          title="Its sections stay as they are"
          action={<Button label="To the reach" href={`/studies/${study.id}/reach`} />}
        >
          This is the reach of a survey. Under Reach a working geometry is made of it, in which
          everything may be changed.
        </Empty>
      ) : (
        <Loading what="Reading the geometry…" />
      )}
    </Screen>
  );
}
