import { useState } from 'react';
import type { Station } from '@/shared/studies/types';
import { formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRemoveStation, useStations } from '@/components/queries/stations';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { StationForm } from './StationForm';

/** The named places of the reach: bridges, gauges, houses. */
export function StationsScreen() {
  const { study, may } = useCurrentStudy();
  const { data: stations, error, refetch } = useStations(study.id);
  const remove = useRemoveStation(study.id);
  const [editing, setEditing] = useState<Station | null>(null);
  const [leaving, setLeaving] = useState<Station | null>(null);
  const mayChange = may('study.change');
  return (
    <Screen
      title="Stations"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      lead="Places where the flood is told first: the tables of a run, and later the client's page, begin with them."
      side={
        mayChange ? (
          <Card title={editing ? `Change ${editing.name}` : 'New station'}>
            <StationForm
              key={editing?.id ?? 'new'}
              studyId={study.id}
              station={editing}
              onDone={() => setEditing(null)}
            />
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
            isChosen={(station) => station.id === editing?.id}
            columns={[
              { key: 'name', title: 'Station', render: (station) => <Txt>{station.name}</Txt> },
              {
                key: 'chainage',
                title: 'Chainage',
                unit: UNITS[study.unitSystem].chainage.symbol,
                align: 'right',
                render: (station) => formatQuantity(station.chainage, 'chainage', study.unitSystem),
              },
              ...(mayChange
                ? [
                    {
                      key: 'change',
                      title: 'Change',
                      render: (station: Station) => (
                        <ButtonRow>
                          <Button
                            kind="quiet"
                            label="Change"
                            name={`Change ${station.name}`}
                            onPress={() => setEditing(station)}
                          />
                          <Button
                            kind="quiet"
                            label="Remove"
                            name={`Remove ${station.name}`}
                            onPress={() => setLeaving(station)}
                          />
                        </ButtonRow>
                      ),
                    },
                  ]
                : []),
            ]}
          />
        </Card>
      ) : null}
      {leaving ? (
        <ConfirmDialog
          title={`Remove ${leaving.name}?`}
          confirm="Remove"
          onClose={() => setLeaving(null)}
          onConfirm={() => remove.mutateAsync(leaving.id)}
        >
          Tables of runs no longer show it. The results themselves stay: they are kept for every
          place along the reach.
        </ConfirmDialog>
      ) : null}
    </Screen>
  );
}
