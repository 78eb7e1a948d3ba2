import { StyleSheet, View } from 'react-native';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Loading } from '@/components/ui/Loading';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { PlacePeaks, Run } from '@/shared/runs/types';
import { formatClock, formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { attenuationWords } from '../runWords';
import type { PlaceResults } from './usePlaceResults';

interface Props {
  run: Run;
  place: PlaceResults;
}

/** The figures that matter at the chosen place. */
export function PlaceFigures({ run, place }: Props) {
  return (
    <Card title={place.name} aside={place.where === place.name ? undefined : place.where}>
      {place.peaks ? (
        <Figures peaks={place.peaks} run={run} />
      ) : (
        <Loading what="Reading the place…" />
      )}
    </Card>
  );
}

function Figures({ peaks, run }: { peaks: PlacePeaks; run: Run }) {
  const system = useUnitSystem();
  const unit = UNITS[system];
  const time = (seconds: number) => shortTime(seconds, run.duration);
  const clock = run.startsAt ? `, ${formatClock(run.startsAt, peaks.peakStageTime)}` : '';
  const change = attenuationWords(peaks.attenuation);
  return (
    <View style={styles.row}>
      <FigureWithUnit
        value={formatQuantity(peaks.peakStage, 'elevation', system)}
        unit={unit.elevation.symbol}
        label={`peak stage, ${time(peaks.peakStageTime)}${clock}`}
      />
      <FigureWithUnit
        value={formatQuantity(peaks.peakFlow, 'flow', system)}
        unit={unit.flow.symbol}
        label={change ? `peak flow, ${change}` : 'peak flow'}
      />
      <FigureWithUnit
        value={peaks.arrival === null ? 'Never' : time(peaks.arrival)}
        label={peaks.arrival === null ? 'the wave does not come here' : 'arrives'}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.three, rowGap: space.one },
});
