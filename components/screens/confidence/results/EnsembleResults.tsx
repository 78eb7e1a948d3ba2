import { useEffect, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { BandChart } from '@/components/charts/BandChart';
import { nearestIndex } from '@/components/charts/geometry/interpolate';
import { usePlace, usePlaceAndTimeStore, useTime } from '@/components/charts/usePlaceAndTime';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { BandSeries, EnsembleResult } from '@/shared/confidence/types';
import { formatChosenLength } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { StudyRibbon } from '../../studies/StudyRibbon';
import { EnsembleTable } from './EnsembleTable';
import { ExceedanceCard } from './ExceedanceCard';
import { StationField } from './StationField';

const NAMES = { line: '50 %', band: '5 to 95 %' };

/** Bands over time at a station and along the reach; the ribbon and the list choose the same station. */
export function EnsembleResults({ result }: { result: EnsembleResult }) {
  const system = useUnitSystem();
  const { study } = useCurrentStudy();
  const store = usePlaceAndTimeStore();
  const at = usePlace(store);
  const t = useTime(store);
  const { stations, times, along, members } = result;
  const chosen = nearestStation(stations, at);
  const station = stations[chosen];
  useEffect(() => {
    const { at: place, t: moment } = store.get();
    const first = stations[nearestStation(stations, place)];
    if (place === null) store.setAt(first.chainage);
    // Where the address says nothing: the highest water of the median.
    const { p50 } = first.stage;
    if (moment === null) store.setT(times[p50.indexOf(Math.max(...p50))]);
  }, [store, stations, times]);

  const stage = useBand(times, station.stage);
  const flow = useBand(times, station.flow);
  const long = useMemo(
    () => ({
      x: along.chainage,
      line: along.peakStage.p50,
      band: { low: along.peakStage.p5, high: along.peakStage.p95 },
      compare: along.base,
      ground: along.bed,
    }),
    [along],
  );
  const time = t === null ? null : Math.min(t, times[times.length - 1]);
  const unit = UNITS[system];
  return (
    <>
      <StudyRibbon studyId={study.id} at={at} onChange={store.setAt} />
      <Notice still>
        {`Of ${members} members on cells of ${formatChosenLength(result.cellSize, system)}, 90 of 100 lie within the bands. They tell of the inputs that were varied and of nothing else: not of the shape of the flood, the survey, or what one dimension leaves out.`}
      </Notice>
      <Card>
        <StationField
          stations={stations}
          chosen={chosen}
          onChange={(k) => store.setAt(stations[k].chainage)}
        />
      </Card>
      <View style={styles.pair}>
        <Card title={`Stage at ${station.name}`} style={styles.half} aside={unit.elevation.symbol}>
          <BandChart
            label={`Stage at ${station.name} with its band`}
            axis="time"
            quantity="elevation"
            data={stage}
            names={NAMES}
            at={time}
            onChange={store.setT}
            unitSystem={system}
          />
        </Card>
        <Card title={`Flow at ${station.name}`} style={styles.half} aside={unit.flow.symbol}>
          <BandChart
            label={`Flow at ${station.name} with its band`}
            axis="time"
            quantity="flow"
            data={flow}
            names={NAMES}
            at={time}
            onChange={store.setT}
            unitSystem={system}
          />
        </Card>
      </View>
      <ExceedanceCard key={station.name} station={station} />
      <Card title="Peak stage along the reach" aside={unit.elevation.symbol}>
        <BandChart
          label="Peak stage along the reach with its band"
          axis="chainage"
          quantity="elevation"
          data={long}
          names={{ ...NAMES, compare: 'base case' }}
          at={at}
          onChange={store.setAt}
          unitSystem={system}
          height={320}
        />
      </Card>
      <EnsembleTable result={result} />
    </>
  );
}

const useBand = (x: number[], { p5, p50, p95 }: BandSeries) =>
  useMemo(() => ({ x, line: p50, band: { low: p5, high: p95 } }), [x, p5, p50, p95]);

/** Stations stand in the order in which they were chosen. */
function nearestStation(stations: EnsembleResult['stations'], at: number | null): number {
  if (at === null) return 0;
  const order = stations
    .map((_, k) => k)
    .sort((a, b) => stations[a].chainage - stations[b].chainage);
  return order[
    nearestIndex(
      order.map((k) => stations[k].chainage),
      at,
    )
  ];
}

const styles = StyleSheet.create({
  pair: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two },
  half: { flexGrow: 1, flexBasis: 340 },
});
