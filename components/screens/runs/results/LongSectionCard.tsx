import { memo, useDeferredValue, useMemo } from 'react';
import { LongSection } from '@/components/charts/LongSection';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace, useTime } from '@/components/charts/usePlaceAndTime';
import { valueAt } from '@/components/charts/geometry/interpolate';
import type { ObservedLevel } from '@/components/charts/geometry/longProfile';
import { surfaceFrame } from '@/components/charts/geometry/surfaceFrame';
import { momentWords } from '@/components/charts/geometry/timeWords';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary, RunSurface } from '@/shared/runs/types';
import type { RaisedPoints } from '../../check/raisedPoints';
import type { PlaceResults } from './usePlaceResults';
import { useLiveWater } from './useLiveWater';
import { useStructuresAt } from './useStructuresAt';
import { useResultSurface } from './useResultSurface';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
  place: PlaceResults;
  /** Levels that a flood was seen at. */
  observed?: readonly ObservedLevel[];
  raised?: RaisedPoints;
  onPoint?: (id: number) => void;
}

/** The whole reach at the chosen time. */
export function LongSectionCard(props: Props) {
  const surface = useResultSurface(props.run.id);
  if (surface.data) return <Drawn {...props} surface={surface.data} />;
  return (
    <Card title="Long section">
      {surface.error ? (
        <ErrorState
          error={surface.error}
          title="The water surface could not be read"
          retry={() => void surface.refetch()}
        />
      ) : (
        <Loading what="Reading the water surface…" />
      )}
    </Card>
  );
}

type Ready = Props & { surface: RunSurface };

function Drawn(props: Ready) {
  // The water moves by itself; its readings follow as the machine allows.
  const t = useDeferredValue(useTime(props.store)) ?? props.summary.times.start;
  return <AtTime {...props} t={t} />;
}

const AtTime = memo(function AtTime(props: Ready & { t: number }) {
  const { run, summary, store, place, surface, observed, raised, onPoint, t } = props;
  const unitSystem = useUnitSystem();
  const { isWide } = useBreakpoint();
  const at = usePlace(store);
  const stage = useMemo(
    () => surfaceFrame(surface, t, new Float32Array(surface.places)),
    [surface, t],
  );
  const { series, isCurrent, peaks } = place;
  const reading =
    isCurrent && series && peaks
      ? { stage: valueAt(series.times, series.stage, t), peakStage: peaks.peakStage }
      : null;
  const live = useLiveWater(store, summary, surface, at, isCurrent ? series : null);
  const standing = useStructuresAt(run.id, summary.structures, t);
  const moment = momentWords(t, run.duration, run.startsAt);
  const legend = [
    'peak dotted',
    'banks dashed',
    ...(observed?.length ? ['observed as crosses'] : []),
    ...(raised?.placed.length ? ['points numbered'] : []),
  ].join(' · ');
  return (
    <Card
      title="Long section"
      // On a phone the time stands below, at the ribbon.
      aside={isWide ? `${moment} · ${legend}` : legend}
    >
      <LongSection
        profile={surface}
        live={live}
        stage={stage}
        sections={summary.sections}
        stations={summary.stations}
        levels={summary.levels}
        structures={summary.structures}
        observed={observed}
        points={raised?.placed}
        onPoint={onPoint}
        {...standing}
        at={at}
        onChange={store.setAt}
        unitSystem={unitSystem}
        label={moment}
        reading={reading}
        height={isWide ? 400 : 300}
      />
    </Card>
  );
});
