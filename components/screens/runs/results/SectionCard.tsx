import { useMemo } from 'react';
import { CrossSection } from '@/components/charts/CrossSection';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace, useTime } from '@/components/charts/usePlaceAndTime';
import { nearestIndex, valueAt } from '@/components/charts/geometry/interpolate';
import { sectionWater, wetWidth } from '@/components/charts/geometry/sectionWater';
import { surfaceFrame } from '@/components/charts/geometry/surfaceFrame';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { useRunSections, type RunSection } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary, RunSurface } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { useResultSurface } from './useResultSurface';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** The section at the chosen place, or the nearest one, with the water of the moment in it. */
export function SectionCard(props: Props) {
  const sections = useRunSections(props.run.id);
  const surface = useResultSurface(props.run.id);
  if (sections.data?.length && surface.data)
    return <Drawn {...props} sections={sections.data} surface={surface.data} />;
  return (
    <Card title="Section">
      {sections.error ? (
        <ErrorState
          error={sections.error}
          title="The sections could not be read"
          retry={() => void sections.refetch()}
        />
      ) : (
        <Loading what="Reading the sections…" />
      )}
    </Card>
  );
}

interface DrawnProps extends Props {
  sections: RunSection[];
  surface: RunSurface;
}

function Drawn({ run, summary, surface, store, sections }: DrawnProps) {
  const unitSystem = useUnitSystem();
  const at = usePlace(store) ?? sections[0].chainage;
  const t = useTime(store) ?? summary.times.start;
  const chainages = useMemo(() => sections.map((section) => section.chainage), [sections]);
  const section = sections[nearestIndex(chainages, at)];
  const frame = useMemo(() => new Float32Array(surface.places), [surface]);
  const stage = valueAt(surface.chainages, surfaceFrame(surface, t, frame), section.chainage);
  const peaks = summary.sections.find(({ id }) => id === section.id);
  const bed = Math.min(...section.points.map(([, ground]) => ground));
  const width = wetWidth(sectionWater(section.points, stage));
  const isHere = Math.abs(section.chainage - at) < 0.005;
  const moment = shortTime(t, run.duration);
  const where = `${section.id}, ${formatWithUnit(section.chainage, 'chainage', unitSystem)}`;
  return (
    <Card title="Section" aside={isHere ? where : `nearest: ${where}`}>
      <CrossSection
        label={`Section ${where}, ${moment} after start`}
        section={section}
        stage={stage}
        peakStage={peaks?.peakStage}
        unitSystem={unitSystem}
      />
      <Txt variant="small" tone="soft">
        {stage - bed > 0.001
          ? `Water at ${formatWithUnit(stage, 'elevation', unitSystem)}, ${formatWithUnit(stage - bed, 'depth', unitSystem)} deep, ${formatWithUnit(width, 'length', unitSystem)} wide at ${moment}. Peak dotted. Looking downstream.`
          : `Dry at ${moment}. Peak dotted. Looking downstream.`}
      </Txt>
    </Card>
  );
}
