import { useDeferredValue, useMemo, useState } from 'react';
import { Hydrograph, type HydrographProps } from '@/components/charts/Hydrograph';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { useTimeInView } from '@/components/charts/useTimeInView';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { StyleSheet } from 'react-native';
import { space } from '@/components/theme/tokens';
import { UNITS } from '@/shared/units/units';
import { SeriesTable } from './SeriesTable';
import { useLiveTime } from './useLiveTime';

interface Props extends Pick<
  HydrographProps,
  | 'quantity'
  | 'series'
  | 'compare'
  | 'peak'
  | 'isGround'
  | 'levels'
  | 'observed'
  | 'points'
  | 'onPoint'
> {
  title: string;
  /** Where, for the names. */
  place: string;
  /** Said beside the unit, e.g. what is dashed. */
  note?: string;
  store: PlaceAndTimeStore;
  startsAt: string | null;
}

/** One quantity against time at the chosen place; the table behind it one press away. */
export function SeriesCard(props: Props) {
  const { title, place, note, quantity, series, compare, peak, isGround, store, startsAt } = props;
  const { levels, observed, points, onPoint } = props;
  const unitSystem = useUnitSystem();
  // While the flood plays, the long section goes first; the curves follow as the machine allows.
  const { watch, t: moment } = useTimeInView(store);
  const t = useDeferredValue(moment);
  const live = useLiveTime(store, 0);
  const [asTable, setAsTable] = useState(false);
  const unit = UNITS[unitSystem][quantity].symbol;
  const name = `${title} at ${place}`;
  const table = useMemo(
    () => <SeriesTable {...{ name, title, quantity, series, startsAt }} />,
    [name, title, quantity, series, startsAt],
  );
  return (
    <Card
      ref={watch}
      title={title}
      style={styles.card}
      aside={
        <>
          <Txt tone="soft">{note ? `${unit}, ${note}` : unit}</Txt>
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
        table
      ) : (
        <Hydrograph
          label={name}
          {...{ quantity, series, compare, peak, levels, isGround, t, live, unitSystem }}
          {...{ observed, points, onPoint }}
          onChange={store.setT}
        />
      )}
    </Card>
  );
}

const styles = StyleSheet.create({
  card: { gap: space.one },
});
