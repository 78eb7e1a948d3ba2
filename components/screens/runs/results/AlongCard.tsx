import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { shortTime } from '@/components/charts/geometry/timeWords';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace } from '@/components/charts/usePlaceAndTime';
import { useRunAlong } from '@/components/queries/runs';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { NumberField } from '@/components/ui/NumberField';
import { SelectField } from '@/components/ui/SelectField';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { AlongQuery } from '@/shared/runs/schemas';
import type { PlaceAlong, RunSummary } from '@/shared/runs/types';
import { formatDuration, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { HazardBand } from './HazardBand';
import { HazardKey } from './HazardKey';
import { useSettled } from './useSettled';

interface Props {
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

type Row = PlaceAlong & { name: string };

const THRESHOLDS = [
  { value: 'rise', label: 'Stage rises by' },
  { value: 'stage', label: 'Stage passes' },
  { value: 'flow', label: 'Flow passes' },
] as const;
const QUANTITY = { rise: 'depth', stage: 'elevation', flow: 'flow' } as const;
/** Long enough to type a number. */
const REST_MS = 400;

/** Hazard along the reach, and when the water comes by a threshold of one's own. */
export function AlongCard({ summary, store }: Props) {
  const system = useUnitSystem();
  const at = usePlace(store);
  const [threshold, setThreshold] = useState<AlongQuery['threshold']>('rise');
  const [value, setValue] = useState<number | null>(0.3);
  const [all, setAll] = useState(summary.stations.length === 0);
  const sound = value !== null && Number.isFinite(value) && (threshold !== 'rise' || value > 0);
  const wish = useMemo(() => (sound ? { threshold, value } : null), [sound, threshold, value]);
  const settled = useSettled(wish, REST_MS);
  // A number that was typed for one threshold is never asked of another.
  const asked = settled?.threshold === threshold ? settled.value : null;
  const along = useRunAlong(summary.runId, threshold, asked);
  const span = summary.times.end - summary.times.start;
  const data = along.data;
  const rows: Row[] = !data
    ? []
    : all
      ? data.sections.map((place) => ({ ...place, name: place.id }))
      : data.stations;
  return (
    <Card
      title="Hazard and arrival"
      aside={
        summary.stations.length ? (
          <Button
            kind="quiet"
            label={all ? 'Stations only' : 'All sections'}
            name={all ? 'Stations only: hazard' : 'All sections: hazard'}
            onPress={() => setAll(!all)}
          />
        ) : undefined
      }
    >
      <View style={styles.fields}>
        <View style={styles.field}>
          <SelectField
            label="The water has come when the"
            value={threshold}
            options={THRESHOLDS}
            onChange={(next) => {
              setThreshold(next);
              setValue(null);
            }}
          />
        </View>
        <View style={styles.field}>
          <NumberField
            label="Threshold"
            quantity={QUANTITY[threshold]}
            value={value}
            onChange={setValue}
            error={
              threshold === 'rise' && value !== null && value <= 0
                ? 'It must be greater than 0.'
                : undefined
            }
          />
        </View>
      </View>
      {asked === null ? <Txt tone="soft">Give the threshold to see when it is passed.</Txt> : null}
      {along.error ? (
        <ErrorState
          error={along.error}
          title="Hazard and arrival could not be read"
          retry={() => void along.refetch()}
        />
      ) : null}
      {along.isLoading ? <Loading what="Reading the values along the reach…" /> : null}
      {data ? (
        <>
          <HazardBand places={data.sections} at={at} onChange={store.setAt} />
          <Table
            label={
              all ? 'Hazard and arrival at all sections' : 'Hazard and arrival at the stations'
            }
            columns={columns(system, span)}
            rows={rows}
            rowKey={({ chainage, name }) => `${chainage} ${name}`}
            isChosen={({ chainage }) => chainage === at}
            onRowPress={({ chainage }) => store.setAt(chainage)}
            maxHeight={420}
          />
          <Txt variant="small" tone="soft">
            {`Arrival is read between the stored moments, ${formatDuration(data.interval)} apart. `}
            The class is the worst of depth and mean velocity at the same moment; the deepest and
            fastest water of a section can be a class worse than its mean.
          </Txt>
          <HazardKey present={new Set(data.sections.map(({ hazard }) => hazard))} />
        </>
      ) : null}
    </Card>
  );
}

function columns(system: UnitSystem, span: number): Column<Row>[] {
  const time = (seconds: number | null) => (seconds === null ? '–' : shortTime(seconds, span));
  return [
    {
      key: 'place',
      title: 'Place',
      render: ({ name, chainage }) => `${name}, ${formatWithUnit(chainage, 'chainage', system)}`,
    },
    { key: 'hazard', title: 'Hazard', render: ({ hazard }) => hazard ?? 'dry' },
    {
      key: 'from',
      title: 'From',
      align: 'right',
      render: ({ hazardFrom }) => time(hazardFrom),
    },
    {
      key: 'arrival',
      title: 'Threshold passed',
      align: 'right',
      render: ({ arrival }) => (arrival === null ? 'never' : shortTime(arrival, span)),
    },
  ];
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two },
  field: { flexGrow: 1, flexBasis: 160, minWidth: 0 },
});
