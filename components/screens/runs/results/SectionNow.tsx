import { memo, useDeferredValue, useMemo, type Ref } from 'react';
import type { View } from 'react-native';
import { CrossSection } from '@/components/charts/CrossSection';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace } from '@/components/charts/usePlaceAndTime';
import { useTimeInView } from '@/components/charts/useTimeInView';
import { nearestIndex } from '@/components/charts/geometry/interpolate';
import { sectionWater, wetWidth } from '@/components/charts/geometry/sectionWater';
import { surfaceLevel } from '@/components/charts/geometry/surfaceFrame';
import { shortTime } from '@/components/charts/geometry/timeWords';
import type { RunSection } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary, RunSurface } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
  sections: RunSection[];
  surface: RunSurface;
}

/** The section at the chosen place, or the nearest one, with the water of the moment in it. */
export function SectionNow({ run, summary, store, sections, surface }: Props) {
  const place = usePlace(store) ?? sections[0].chainage;
  // As with the curves: while the flood plays, the long section goes first.
  const { watch, t: moment } = useTimeInView(store);
  const t = useDeferredValue(moment) ?? summary.times.start;
  const chainages = useMemo(() => sections.map(({ chainage }) => chainage), [sections]);
  const section = sections[nearestIndex(chainages, place)];
  const stage = surfaceLevel(surface, t, section.chainage);
  return (
    <Drawn
      ref={watch}
      section={section}
      isHere={Math.abs(section.chainage - place) < 0.005}
      stage={stage}
      peakStage={summary.sections.find(({ id }) => id === section.id)?.peakStage ?? null}
      moment={shortTime(t, run.duration)}
    />
  );
}

interface DrawnProps {
  ref: Ref<View>;
  section: RunSection;
  isHere: boolean;
  stage: number;
  peakStage: number | null;
  moment: string;
}

const Drawn = memo(function Drawn({ ref, section, isHere, stage, peakStage, moment }: DrawnProps) {
  const unitSystem = useUnitSystem();
  const where = `${section.id}, ${formatWithUnit(section.chainage, 'chainage', unitSystem)}`;
  const depth = stage - Math.min(...section.points.map(([, ground]) => ground));
  const width = wetWidth(sectionWater(section.points, stage));
  const water = [
    `Water at ${formatWithUnit(stage, 'elevation', unitSystem)}`,
    `${formatWithUnit(depth, 'depth', unitSystem)} deep`,
    `${formatWithUnit(width, 'length', unitSystem)} wide at ${moment}.`,
  ];
  return (
    <Card ref={ref} title="Section" aside={isHere ? where : `nearest: ${where}`}>
      <CrossSection
        label={`Section ${where}, ${moment} after start`}
        {...{ section, stage, peakStage, unitSystem }}
      />
      <Txt variant="small" tone="soft">
        {`${depth > DRY ? water.join(', ') : `Dry at ${moment}.`} Peak dotted. Looking downstream.`}
      </Txt>
    </Card>
  );
});

/** Thinner water than this is none, m. */
const DRY = 0.001;
