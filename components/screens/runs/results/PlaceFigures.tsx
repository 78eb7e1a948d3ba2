import { StyleSheet, View } from 'react-native';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { space } from '@/components/theme/tokens';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
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
  const { isWide } = useBreakpoint();
  const figures = place.peaks ? (
    <Figures peaks={place.peaks} run={run} />
  ) : (
    <Loading what="Reading the place…" />
  );
  const where = place.where === place.name ? undefined : place.where;
  if (isWide)
    return (
      <Card title={place.name} aside={where}>
        {figures}
      </Card>
    );
  return (
    <View role="region" aria-label={place.name} style={styles.plain}>
      <Txt variant="lead" strong heading={2}>
        {`${place.name} `}
        {where ? (
          <Txt variant="lead" tone="soft">
            {where}
          </Txt>
        ) : null}
      </Txt>
      {figures}
    </View>
  );
}

function Figures({ peaks, run }: { peaks: PlacePeaks; run: Run }) {
  const system = useUnitSystem();
  const unit = UNITS[system];
  const time = (seconds: number) => shortTime(seconds, run.duration);
  const moments = [
    'peak stage',
    unbroken(time(peaks.peakStageTime)),
    ...(run.startsAt ? [unbroken(formatClock(run.startsAt, peaks.peakStageTime))] : []),
  ];
  const change = attenuationWords(peaks.attenuation);
  return (
    <View style={styles.row}>
      <View style={styles.figure}>
        <FigureWithUnit
          value={formatQuantity(peaks.peakStage, 'elevation', system)}
          unit={unit.elevation.symbol}
          label={moments.join(', ')}
        />
      </View>
      <View style={styles.figure}>
        <FigureWithUnit
          value={formatQuantity(peaks.peakFlow, 'flow', system)}
          unit={unit.flow.symbol}
          label={change ? `peak flow, ${change}` : 'peak flow'}
        />
      </View>
      <View style={styles.figure}>
        <FigureWithUnit
          value={peaks.arrival === null ? 'Never' : time(peaks.arrival)}
          label={peaks.arrival === null ? 'the wave does not come here' : 'arrives'}
        />
      </View>
    </View>
  );
}

/** Hours stay with their minutes where the label is broken. */
const unbroken = (text: string) => text.replaceAll(' ', '\u00a0');

const styles = StyleSheet.create({
  plain: { gap: space.half },
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 12, rowGap: space.one },
  // Labels are broken before a figure is.
  figure: { flexGrow: 1, flexShrink: 1, flexBasis: 80, minWidth: 'min-content' } as object,
});
