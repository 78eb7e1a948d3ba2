import { useLocalSearchParams, useRouter } from 'expo-router';
import { pictureOfRuns } from '@/components/charts/picture/pictureSources';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Cautions } from '@/components/layout/Cautions';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useComparison } from '@/components/queries/comparison';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import { COMPARED_RUNS } from '@/shared/comparison/schemas';
import type { RunComparison } from '@/shared/comparison/types';
import { ChooseRuns } from './ChooseRuns';
import { DifferencesCard } from './DifferencesCard';
import { EnvelopesCard } from './EnvelopesCard';
import { HydrographsCard } from './HydrographsCard';
import { PlacesCard } from './PlacesCard';
import { readRunIds } from './runIds';

/** Two to four runs side by side. The address keeps which. */
export function CompareScreen() {
  const { study } = useCurrentStudy();
  const router = useRouter();
  const { isWide } = useBreakpoint();
  const params = useLocalSearchParams<{ runs?: string }>();
  const runIds = readRunIds(params.runs);
  const { data, error, refetch } = useComparison(study.id, runIds);
  const isEnough = runIds.length >= COMPARED_RUNS.min;
  const root = `/studies/${study.id}` as const;
  const choose = (
    <ChooseRuns chosen={runIds} onChange={(ids) => router.setParams({ runs: ids.join(',') })} />
  );
  return (
    <Screen
      title="Compare runs"
      crumbs={[
        { label: study.title, href: root },
        { label: 'Runs', href: `${root}/runs` },
        { label: 'Compare' },
      ]}
      lead="The first run is what the others are measured against."
      ribbon={isEnough && data ? <Ribbon comparison={data} /> : undefined}
      side={isWide || isEnough ? choose : undefined}
      picture={data ? pictureOfRuns(study, data.runs) : null}
    >
      {isWide || isEnough ? null : choose}
      {error ? (
        <ErrorState
          error={error}
          title="The runs could not be compared"
          retry={() => void refetch()}
        />
      ) : null}
      {isEnough && !data && !error ? <Loading what="Reading the runs…" /> : null}
      {isEnough && data && !error ? <Compared comparison={data} /> : null}
      {isEnough ? null : (
        <Notice tone="info" still>
          Choose two runs or more, four at most.
        </Notice>
      )}
      <Cautions />
    </Screen>
  );
}

function Compared({ comparison }: { comparison: RunComparison }) {
  return (
    <>
      {comparison.sameReach ? null : (
        <Notice tone="attention" title="Not the same reach" still>
          The runs are on sections of different shape or place. They are compared by chainage: a
          level that differs may be the ground and not the water.
        </Notice>
      )}
      <EnvelopesCard runs={comparison.runs} />
      <HydrographsCard comparison={comparison} />
      <PlacesCard comparison={comparison} />
      <DifferencesCard comparison={comparison} />
    </>
  );
}

function Ribbon({ comparison }: { comparison: RunComparison }) {
  const { study } = useCurrentStudy();
  const { at, setAt } = usePlaceAndTime();
  const { places } = comparison;
  const sections = places
    .filter(({ kind }) => kind === 'section')
    .map(({ name, chainage }) => ({ id: name, chainage }));
  return (
    <ReachRibbon
      sections={sections}
      stations={places.filter(({ kind }) => kind === 'station')}
      at={at}
      onChange={setAt}
      unitSystem={study.unitSystem}
    />
  );
}
