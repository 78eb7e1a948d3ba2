import { useDeferredValue, useMemo, useState } from 'react';
import { StyleSheet } from 'react-native';
import { valueAt } from '@/components/charts/geometry/interpolate';
import { shortTime } from '@/components/charts/geometry/timeWords';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { RatingLoop } from '@/components/charts/RatingLoop';
import { useTimeInView } from '@/components/charts/useTimeInView';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunSeries } from '@/shared/runs/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { useLiveTime } from './useLiveTime';

interface Props {
  place: string;
  series: RunSeries;
  store: PlaceAndTimeStore;
}

/** More rows than this are thinned; the files hold them all. */
const ROWS = 150;

/** Stage against flow at the chosen place; the table behind it one press away. */
export function RatingCard({ place, series, store }: Props) {
  const system = useUnitSystem();
  const { watch, t: moment } = useTimeInView(store);
  const t = useDeferredValue(moment);
  const live = useLiveTime(store, 0);
  const [asTable, setAsTable] = useState(false);
  const { times, stage, flow } = series;
  const loop = useMemo(() => ({ times, stage, flow }), [times, stage, flow]);
  const name = `Stage against flow at ${place}`;
  const span = times.length ? times[times.length - 1] - times[0] : 0;
  return (
    <Card
      ref={watch}
      title="Stage against flow"
      style={styles.card}
      aside={
        <>
          <Txt tone="soft">{`${UNITS[system].elevation.symbol} over ${UNITS[system].flow.symbol}`}</Txt>
          <Button
            kind="quiet"
            label={asTable ? 'Curve' : 'Table'}
            name={asTable ? `${name} as a curve` : `${name} as a table`}
            onPress={() => setAsTable(!asTable)}
          />
        </>
      }
    >
      {asTable ? (
        <Table
          label={name}
          columns={columns(system, span)}
          rows={rowsOf(series)}
          rowKey={({ time }) => time}
          maxHeight={280}
        />
      ) : (
        <RatingLoop label={name} series={loop} t={t} live={live} unitSystem={system} />
      )}
      <Txt variant="small" tone="soft">
        {t !== null && times.length
          ? `${formatWithUnit(valueAt(times, flow, t), 'flow', system)} at ${formatWithUnit(valueAt(times, stage, t), 'elevation', system)}, ${shortTime(t, span)} after the start. `
          : ''}
        Rising whole, falling dashed. Where the two part, one stage carries two flows, and a rating
        read from a single curve is off by their distance.
      </Txt>
    </Card>
  );
}

interface Row {
  time: number;
  stage: number;
  flow: number;
}

function rowsOf({ times, stage, flow }: RunSeries): Row[] {
  const step = Math.max(1, Math.ceil(times.length / ROWS));
  return times
    .map((time, k) => ({ time, stage: stage[k], flow: flow[k] }))
    .filter((_, k) => k % step === 0 || k === times.length - 1);
}

const columns = (system: UnitSystem, span: number): Column<Row>[] => [
  { key: 'time', title: 'After start', render: ({ time }) => shortTime(time, span) },
  {
    key: 'flow',
    title: 'Flow',
    unit: UNITS[system].flow.symbol,
    align: 'right',
    render: ({ flow }) => formatQuantity(flow, 'flow', system),
  },
  {
    key: 'stage',
    title: 'Stage',
    unit: UNITS[system].elevation.symbol,
    align: 'right',
    render: ({ stage }) => formatQuantity(stage, 'elevation', system),
  },
];

const styles = StyleSheet.create({
  card: { gap: space.one },
});
