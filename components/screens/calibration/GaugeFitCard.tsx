import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { CurveSet } from '@/components/charts/CurveSet';
import { OBSERVED_LOOK } from '@/components/charts/curveLooks';
import type { SetCurve } from '@/components/charts/geometry/curveSetModel';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { useRunSeries } from '@/components/queries/runs';
import type { GaugeFigures, GaugeFit } from '@/shared/calibration/types';
import type { Run } from '@/shared/runs/types';
import {
  formatDuration,
  formatNumber,
  formatQuantity,
  formatWithUnit,
} from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { signed } from './floodWords';

const WHY: Record<NonNullable<GaugeFit['why']>, string> = {
  offReach: 'The gauge lies off the reach of this run.',
  noClock:
    'The record is told by the clock and the scenario has no start: give the scenario the day and time of its first hour and route it again.',
  noOverlap: 'The record and the run share no two moments. Look at when each begins.',
};

/** The record of a gauge on the hydrograph, with the figures of the fit. */
export function GaugeFitCard({ fit, run }: { fit: GaugeFit; run: Run }) {
  const system = useUnitSystem();
  const quantity = fit.quantity === 'stage' ? 'elevation' : 'flow';
  const title = `${fit.quantity === 'stage' ? 'Stage' : 'Flow'} at ${fit.name}`;
  return (
    <Card
      title={title}
      aside={`${formatWithUnit(fit.chainage, 'chainage', system)} · ${UNITS[system][quantity].symbol}`}
    >
      {fit.why ? (
        <Notice tone="attention" still>
          {WHY[fit.why]}
        </Notice>
      ) : null}
      {fit.figures ? (
        <>
          <Figures figures={fit.figures} quantity={fit.quantity} />
          <Curves fit={fit} run={run} title={title} />
        </>
      ) : null}
    </Card>
  );
}

function Curves({ fit, run, title }: { fit: GaugeFit; run: Run; title: string }) {
  const system = useUnitSystem();
  const { t, setT } = usePlaceAndTime();
  const { data } = useRunSeries(run.id, fit.chainage);
  const { series, quantity } = fit;
  const curves = useMemo((): SetCurve[] => {
    const { times, observed, computed } = series!;
    const whole = data ? { x: data.times, y: data[quantity] } : { x: times, y: computed };
    return [
      { name: 'Computed', ...whole, look: 0 },
      { name: 'Observed', x: times, y: observed, look: OBSERVED_LOOK, dots: true },
    ];
  }, [series, data, quantity]);
  return (
    <CurveSet
      label={title}
      curves={curves}
      foot="time"
      value={quantity === 'stage' ? 'elevation' : 'flow'}
      unitSystem={system}
      at={t}
      onChange={setT}
      height={220}
    />
  );
}

function Figures({ figures, quantity }: { figures: GaugeFigures; quantity: GaugeFit['quantity'] }) {
  const system = useUnitSystem();
  const kind = quantity === 'stage' ? 'depth' : 'flow';
  const unit = UNITS[system][kind].symbol;
  const show = (value: number) => formatQuantity(value, kind, system);
  const { efficiency, rms, mean, peak, count } = figures;
  return (
    <>
      <View style={styles.row}>
        <FigureWithUnit
          value={efficiency === null ? '–' : formatNumber(efficiency, 3)}
          label="efficiency, Nash and Sutcliffe"
        />
        <FigureWithUnit value={show(rms)} unit={unit} label="root mean square error" />
        {peak ? (
          <>
            <FigureWithUnit
              value={signed(show(peak.error), peak.error)}
              unit={unit}
              label="at the peak"
            />
            <FigureWithUnit
              value={formatDuration(Math.abs(peak.delay))}
              label={delayWords(peak.delay)}
            />
          </>
        ) : null}
      </View>
      <Txt variant="small" tone="soft">
        {`Over ${formatNumber(count, 0)} observed values; mean error ${signed(show(mean), mean)} ${unit}. Efficiency: 1 is perfect, 0 no better than the mean of the record.${peak ? '' : ' The record begins or ends with its highest value, so it tells no peak.'}`}
      </Txt>
    </>
  );
}

const delayWords = (delay: number) =>
  Math.abs(delay) < 30 ? 'peak at the same time' : delay > 0 ? 'peak too late' : 'peak too early';

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.four, rowGap: space.two },
});
