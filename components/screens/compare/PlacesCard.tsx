import { useState } from 'react';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunComparison } from '@/shared/comparison/types';
import { placeColumns } from './placeColumns';

/** Peaks and arrival of the first run at each place, and by how much the others differ. */
export function PlacesCard({ comparison }: { comparison: RunComparison }) {
  const system = useUnitSystem();
  const { at, setAt } = usePlaceAndTime();
  const { places, runs } = comparison;
  const stations = places.filter(({ kind }) => kind === 'station');
  const [all, setAll] = useState(false);
  const isAll = all || stations.length === 0;
  const rows = isAll ? places.filter(({ kind }) => kind === 'section') : stations;
  const title = isAll ? 'Differences at all sections' : 'Differences at the stations';
  return (
    <Card
      title={title}
      aside={
        stations.length > 0 ? (
          <Button
            kind="quiet"
            label={isAll ? 'Stations only' : 'All sections'}
            onPress={() => setAll(!all)}
          />
        ) : undefined
      }
    >
      <Table
        label={title}
        columns={placeColumns(runs, system)}
        rows={rows}
        rowKey={({ chainage, name }) => `${chainage} ${name}`}
        isChosen={({ chainage }) => chainage === at}
        onRowPress={({ chainage }) => setAt(chainage)}
        maxHeight={460}
      />
      <Txt variant="small" tone="soft">
        {`Values of run ${runs[0].number}; of the others what they have more or less. Times count from the start of each run.`}
      </Txt>
    </Card>
  );
}
