import { useEffect, useMemo, useState } from 'react';
import { View } from 'react-native';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { Button } from '@/components/ui/Button';
import type { IssuedStation } from '@/shared/review/types';
import { SeriesCard } from '../runs/results/SeriesCard';

interface Props {
  station: IssuedStation;
  startsAt: string | null;
  store: PlaceAndTimeStore;
}

/** Stage, or depth, and flow against time; the cursor starts at the highest water. */
export function IssuedCurves({ station, startsAt, store }: Props) {
  const { name, times, stage, depth, flow, peakStageTime } = station;
  const [asDepth, setAsDepth] = useState(false);
  const curves = useMemo(
    () => ({
      stage: { times, values: stage },
      depth: { times, values: depth },
      flow: { times, values: flow },
    }),
    [times, stage, depth, flow],
  );
  useEffect(() => {
    const { t } = store.get();
    if (t === null || t < times[0] || t > times[times.length - 1]) store.setT(peakStageTime);
  }, [store, times, peakStageTime]);
  const common = { place: name, store, startsAt };
  return (
    <>
      {asDepth ? (
        <SeriesCard {...common} title="Depth" quantity="depth" series={curves.depth} />
      ) : (
        <SeriesCard
          {...common}
          title="Stage"
          quantity="elevation"
          series={curves.stage}
          peak={{ value: station.peakStage, time: peakStageTime }}
        />
      )}
      <View>
        <Button
          kind="quiet"
          label={asDepth ? 'Show stage above datum' : 'Show depth of water'}
          onPress={() => setAsDepth(!asDepth)}
        />
      </View>
      <SeriesCard
        {...common}
        title="Flow"
        quantity="flow"
        series={curves.flow}
        peak={{ value: station.peakFlow, time: station.peakFlowTime }}
      />
    </>
  );
}
