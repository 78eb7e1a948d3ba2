import { pictureOfRun } from '@/components/charts/picture/pictureSources';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace, usePlaceAndTimeStore } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useRunDownload } from '@/components/queries/runs';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Badge } from '@/components/ui/Badge';
import { ErrorState } from '@/components/ui/ErrorState';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary } from '@/shared/runs/types';
import { CheckLink } from '../../check/CheckLink';
import { runBadge } from '../../check/reviewWords';
import { Cautions } from '../Cautions';
import { runCrumbs } from '../runCrumbs';
import { AlongCard } from './AlongCard';
import { AsSigned } from './AsSigned';
import { ComputedCard } from './ComputedCard';
import { LevelsCard } from './LevelsCard';
import { LongSectionCard } from './LongSectionCard';
import { ObservedCard } from './ObservedCard';
import { PeaksCard } from './PeaksCard';
import { PlaceFigures } from './PlaceFigures';
import { PlaceSeries } from './PlaceSeries';
import { ReservoirCard } from './ReservoirCard';
import { RunDownloads } from './RunDownloads';
import { SectionCard } from './SectionCard';
import { StructuresCard } from './StructuresCard';
import { TimeBar } from './TimeBar';
import { useFirstLook } from './useFirstLook';
import { useObservedFlood } from './useObservedFlood';
import { usePlaceResults } from './usePlaceResults';
import { useRaisedPoints } from './useRaisedPoints';
import { VolumeCard } from './VolumeCard';
import { WarningsCard } from './WarningsCard';

interface Props {
  run: Run;
  summary: RunSummary;
}

/** The place by the reach ribbon, the time by the flood itself, and every drawing follows both. */
export function ResultsScreen({ run, summary }: Props) {
  const store = usePlaceAndTimeStore();
  useFirstLook(store, summary);
  const { isWide } = useBreakpoint();
  const download = useRunDownload(run.id);
  const place = usePlaceResults(run, summary, usePlace(store));
  const common = { run, summary, store };
  const observed = useObservedFlood(run);
  const pinned = useRaisedPoints(run, summary);
  const longSection = (
    <LongSectionCard {...common} {...pinned} place={place} observed={observed.levels} />
  );
  const series = (
    <PlaceSeries {...common} {...pinned} place={place} residuals={observed.residuals} />
  );
  const seen = observed.floods.length > 0 ? <ObservedCard {...{ run, observed, store }} /> : null;

  return (
    <Screen
      title={run.scenarioName}
      crumbs={runCrumbs(run)}
      badge={<Badge {...runBadge(run)} />}
      picture={pictureOfRun(run)}
      ribbon={<Ribbon {...common} />}
      actions={
        <>
          <RunDownloads download={download} summary={summary} />
          <CheckLink run={run} />
        </>
      }
      side={
        isWide ? (
          <>
            <PlaceFigures {...common} place={place} />
            {series}
            <SectionCard {...common} />
          </>
        ) : null
      }
      footer={<TimeBar {...common} />}
    >
      {download.error ? (
        <ErrorState error={download.error} title="The file could not be saved" />
      ) : null}
      {summary.signed ? <AsSigned studyId={run.studyId} signed={summary.signed} /> : null}
      {isWide ? (
        <>
          {longSection}
          {seen}
        </>
      ) : (
        <>
          <PlaceFigures {...common} place={place} />
          {longSection}
          {series}
          {seen}
          <SectionCard {...common} />
        </>
      )}
      {summary.structures.length > 0 ? <StructuresCard {...common} /> : null}
      {summary.reservoir ? <ReservoirCard {...common} reservoir={summary.reservoir} /> : null}
      <PeaksCard {...common} />
      {summary.levels.length > 0 ? <LevelsCard {...common} /> : null}
      <AlongCard {...common} />
      <WarningsCard {...common} />
      <VolumeCard summary={summary} />
      <ComputedCard run={run} summary={summary} />
      <Cautions />
    </Screen>
  );
}

function Ribbon({ summary, store }: { summary: RunSummary; store: PlaceAndTimeStore }) {
  return (
    <ReachRibbon
      sections={summary.sections}
      stations={summary.stations}
      structures={summary.structures}
      at={usePlace(store)}
      onChange={store.setAt}
      unitSystem={useUnitSystem()}
    />
  );
}
