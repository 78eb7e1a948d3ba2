import { useMemo } from 'react';
import { CurveSet } from '@/components/charts/CurveSet';
import type { SetCurve } from '@/components/charts/geometry/curveSetModel';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { useRunSurfaces } from '@/components/queries/runs';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ComparedRun } from '@/shared/comparison/types';
import { runName } from './runName';

/** The highest water of each run along the reach, over the ground of the first. */
export function EnvelopesCard({ runs }: { runs: ComparedRun[] }) {
  const system = useUnitSystem();
  const { isWide } = useBreakpoint();
  const { at, setAt } = usePlaceAndTime();
  const { surfaces, error, retry } = useRunSurfaces(
    runs.map(({ id }) => id),
    isWide ? 480 : 240,
  );
  const curves = useMemo(
    () =>
      surfaces?.map(({ chainages, peakStage }, i): SetCurve => ({
        name: runName(runs[i]),
        x: chainages,
        y: peakStage,
        look: i,
      })),
    [surfaces, runs],
  );
  const ground = useMemo(
    () => (surfaces ? { x: surfaces[0].chainages, y: surfaces[0].bed } : null),
    [surfaces],
  );
  return (
    <Card title="Highest water along the reach">
      {curves ? (
        <CurveSet
          label="Highest water along the reach"
          curves={curves}
          ground={ground}
          foot="place"
          value="elevation"
          unitSystem={system}
          at={at}
          onChange={setAt}
          height={isWide ? 360 : 280}
        />
      ) : error ? (
        <ErrorState error={error} title="The water surfaces could not be read" retry={retry} />
      ) : (
        <Loading what="Reading the water surfaces…" />
      )}
    </Card>
  );
}
