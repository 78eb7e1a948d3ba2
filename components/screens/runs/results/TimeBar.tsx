import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { TimeRibbon } from '@/components/charts/TimeRibbon';
import { usePlayback } from '@/components/charts/usePlayback';
import { useTime } from '@/components/charts/usePlaceAndTime';
import { timeWords } from '@/components/charts/geometry/timeWords';
import { space } from '@/components/theme/tokens';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Button } from '@/components/ui/Button';
import { Txt } from '@/components/ui/Txt';
import type { Run, RunSummary } from '@/shared/runs/types';
import { useLiveTime } from './useLiveTime';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** How long the whole flood takes to play, s. */
const PACES = [20, 40, 80, 10];

/** Time within thumb reach: the flood to drag along, and play. */
export function TimeBar({ run, summary, store }: Props) {
  const { isWide } = useBreakpoint();
  const { start, end, interval } = summary.times;
  const t = useTime(store) ?? start;
  const [pace, setPace] = useState(0);
  const { isPlaying, play, pause } = usePlayback(store, { start, end }, PACES[pace]);
  const live = useLiveTime(store, start);
  const move = (to: number) => {
    pause();
    store.setT(to);
  };
  return (
    <View style={isWide ? styles.wide : styles.phone}>
      <View style={isWide ? styles.aside : styles.controls}>
        <View style={styles.controls}>
          <Button label={isPlaying ? 'Pause' : 'Play'} onPress={isPlaying ? pause : play} />
          <Button
            kind="quiet"
            label={`in ${PACES[pace]} s`}
            name={`Pace: the whole flood in ${PACES[pace]} s, press to change`}
            onPress={() => setPace((pace + 1) % PACES.length)}
          />
        </View>
        <Txt strong style={isWide ? null : styles.time}>
          {timeWords(t, run.duration, run.startsAt)}
        </Txt>
      </View>
      <View style={isWide ? styles.ribbonWide : null}>
        <TimeRibbon
          inflow={run.inflow}
          start={start}
          end={end}
          live={live}
          t={t}
          onChange={move}
          step={interval > 0 ? interval : (end - start) / 100}
          startsAt={run.startsAt}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', gap: space.two, alignItems: 'center' },
  phone: { gap: space.half },
  controls: { flexDirection: 'row', alignItems: 'center', columnGap: space.one },
  aside: { width: 176, gap: space.half },
  ribbonWide: { flex: 1, minWidth: 0 },
  time: { marginLeft: 'auto', flexShrink: 1, textAlign: 'right' },
});
