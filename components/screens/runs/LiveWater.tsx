import { useMemo } from 'react';
import { LongSection } from '@/components/charts/LongSection';
import { shortTime } from '@/components/charts/geometry/timeWords';
import type { RunProgress } from '@/components/queries/useRunEvents';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';

interface Props {
  surface: RunProgress['surface'];
  /** Highest water so far, m. */
  highest: number[] | null;
  /** Simulated time of the surface and length of the run, s. */
  time: number;
  span: number;
}

/** The wave on its way while it computes. */
export function LiveWater({ surface, highest, time, span }: Props) {
  const unitSystem = useUnitSystem();
  const profile = useMemo(
    () => surface && { chainages: surface.chainages, bed: surface.bed, peakStage: highest },
    [surface, highest],
  );
  const moment = `${shortTime(time, span)} after start`;
  return (
    <Card title="Water of the moment" aside={surface ? `${moment} · highest so far dotted` : null}>
      {surface && profile ? (
        <LongSection
          profile={profile}
          stage={surface.stage}
          sections={NONE}
          at={null}
          unitSystem={unitSystem}
          label={moment}
        />
      ) : (
        <Txt tone="soft">The water shows as soon as the first steps are computed.</Txt>
      )}
    </Card>
  );
}

const NONE: never[] = [];
