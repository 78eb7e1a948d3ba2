import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { RunStructure, RunStructureSeries } from '@/shared/runs/types';
import { SeriesCard } from './SeriesCard';

interface Props {
  structure: RunStructure;
  series: RunStructureSeries;
  store: PlaceAndTimeStore;
  startsAt: string | null;
}

/** Flow and the stages on both sides against time; of a failing dam its breach. */
export function StructureCurves({ structure, series, store, startsAt }: Props) {
  const { id, peak } = structure;
  const curves = useMemo(() => {
    const { times, flow, stageUp, stageDown, breach } = series;
    return {
      flow: { times, values: flow },
      above: { times, values: stageUp },
      below: { times, values: stageDown },
      bottom: breach && { times, values: breach.bottom },
    };
  }, [series]);
  const common = { place: id, store, startsAt };
  return (
    <>
      <SeriesCard
        {...common}
        title="Flow past it"
        quantity="flow"
        series={curves.flow}
        peak={{ value: peak.flow, time: peak.flowTime }}
      />
      <SeriesCard
        {...common}
        title="Stage above it"
        note="below it dashed"
        quantity="elevation"
        series={curves.above}
        compare={curves.below}
        peak={{ value: peak.stageUp, time: peak.stageUpTime }}
      />
      {curves.bottom ? (
        <SeriesCard
          {...common}
          title="Bottom of the breach"
          quantity="elevation"
          series={curves.bottom}
          peak={null}
          isGround
        />
      ) : null}
    </>
  );
}
