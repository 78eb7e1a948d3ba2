import { useMemo } from 'react';
import { CurveSet } from '@/components/charts/CurveSet';
import { OBSERVED_LOOK } from '@/components/charts/curveLooks';
import type { SetCurve } from '@/components/charts/geometry/curveSetModel';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunResiduals } from '@/shared/calibration/types';
import type { Run } from '@/shared/runs/types';
import { Txt } from '@/components/ui/Txt';
import { useResultSurface } from '../runs/results/useResultSurface';

interface Props {
  run: Run;
  residuals: RunResiduals;
}

/** The marks on the long section, each with what it is allowed. */
export function MarksAlongCard({ run, residuals }: Props) {
  const system = useUnitSystem();
  const { isWide } = useBreakpoint();
  const { at, setAt } = usePlaceAndTime();
  const surface = useResultSurface(run.id);
  const curves = useMemo((): SetCurve[] => {
    if (!surface.data) return [];
    const { chainages, peakStage } = surface.data;
    const { marks } = residuals;
    return [
      { name: 'Computed peak', x: chainages, y: peakStage, look: 0 },
      {
        name: 'Marks with their tolerance',
        x: marks.map(({ mark }) => mark.chainage),
        y: marks.map(({ mark }) => mark.level),
        reach: marks.map(({ tolerance }) => tolerance),
        look: OBSERVED_LOOK,
        dots: true,
      },
    ];
  }, [surface.data, residuals]);
  const off = useMemo(
    () => (surface.data ? residualCurves(residuals, surface.data.chainages) : []),
    [residuals, surface.data],
  );
  const ground = useMemo(
    () => surface.data && { x: surface.data.chainages, y: surface.data.bed },
    [surface.data],
  );
  return (
    <Card title="Marks on the long section">
      {surface.data ? (
        <>
          <CurveSet
            label="Marks on the long section"
            curves={curves}
            ground={ground}
            foot="place"
            value="elevation"
            unitSystem={system}
            at={at}
            onChange={setAt}
            height={isWide ? 360 : 280}
          />
          {off.length > 1 ? (
            <>
              <Txt variant="small" tone="soft">
                The same as residuals: a bar that reaches zero lies within its tolerance.
              </Txt>
              <CurveSet
                label="Residuals along the reach"
                curves={off}
                foot="place"
                value="depth"
                valueName="residual"
                unitSystem={system}
                at={at}
                onChange={setAt}
                height={200}
              />
            </>
          ) : null}
        </>
      ) : surface.error ? (
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

/** Residuals by chainage about a line at zero over the whole reach; nothing where no mark can be compared. */
function residualCurves({ marks }: RunResiduals, reach: ArrayLike<number>): SetCurve[] {
  const known = marks.filter(({ residual }) => residual !== null);
  if (known.length === 0) return [];
  const x = known.map(({ mark }) => mark.chainage);
  return [
    { name: 'No difference', x: [reach[0], reach[reach.length - 1]], y: [0, 0], look: 3 },
    {
      name: 'Residual with its tolerance',
      x,
      y: known.map(({ residual }) => residual!),
      reach: known.map(({ tolerance }) => tolerance),
      look: OBSERVED_LOOK,
      dots: true,
    },
  ];
}
