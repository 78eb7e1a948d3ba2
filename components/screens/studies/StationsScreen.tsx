import { useState } from 'react';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useStations } from '@/components/queries/stations';
import { Card } from '@/components/ui/Card';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { Station } from '@/shared/studies/types';
import { levelName } from '@/shared/studies/stationLevels';
import { formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { StationDialog } from './StationDialog';
import { StationForm } from './StationForm';
import { isOutside } from './reachSpan';
import { StudyRibbon } from './StudyRibbon';
import { useNewestReachRow } from './useNewestReach';

/** The named places of the reach: bridges, gauges, houses. */
export function StationsScreen() {
  const { study, may } = useCurrentStudy();
  const { at, setAt } = usePlaceAndTime();
  const { data: stations, error, refetch } = useStations(study.id);
  const reach = useNewestReachRow(study.id);
  const [changing, setChanging] = useState<Station | null>(null);
  const mayChange = may('study.change');
  const choose = (station: Station) => {
    setAt(station.chainage);
    if (mayChange) setChanging(station);
  };
  return (
    <Screen
      title="Stations"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      lead="Places where the flood is told first: the tables of a run, and later the client’s page, begin with them."
      ribbon={<StudyRibbon studyId={study.id} at={at} onChange={setAt} />}
      side={
        mayChange ? (
          <Card title="New station">
            <StationForm studyId={study.id} station={null} at={reach ? at : null} />
          </Card>
        ) : undefined
      }
    >
      {error && !stations ? (
        <ErrorState
          error={error}
          title="The stations could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!stations && !error ? <Loading what="Reading the stations…" /> : null}
      {stations?.length === 0 ? (
        <Empty title="No stations yet">
          Name the bridge, the gauge, the mill: wherever somebody will ask how high the water gets
          and when. A name and its chainage are enough.
        </Empty>
      ) : null}
      {stations?.length ? (
        <Card>
          <Table
            label="Stations"
            rows={stations}
            rowKey={(station) => station.id}
            isChosen={(station) => station.chainage === at}
            onRowPress={choose}
            columns={[
              {
                key: 'name',
                title: 'Station',
                render: ({ name, chainage }) =>
                  isOutside(chainage, reach) ? `${name}, outside the reach` : name,
              },
              {
                key: 'chainage',
                title: 'Chainage',
                unit: UNITS[study.unitSystem].chainage.symbol,
                align: 'right',
                render: (station) => formatQuantity(station.chainage, 'chainage', study.unitSystem),
              },
              {
                key: 'levels',
                title: 'Levels',
                render: ({ levels = [] }) => levels.map(levelName).join('; ') || '–',
              },
            ]}
          />
          {mayChange ? (
            <Txt variant="small" tone="soft">
              Choose one to rename, move or remove it, or to change its levels.
            </Txt>
          ) : null}
        </Card>
      ) : null}
      {changing ? (
        <StationDialog studyId={study.id} station={changing} onClose={() => setChanging(null)} />
      ) : null}
    </Screen>
  );
}
