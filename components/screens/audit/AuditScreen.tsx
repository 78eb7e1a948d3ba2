import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useAudit, useAuditDownload, type AuditFilter } from '@/components/queries/audit';
import { useMe } from '@/components/queries/SessionProvider';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { useSettled } from '../runs/results/useSettled';
import { AuditTable } from './AuditTable';

const REST_MS = 350;
const EVERYTHING: AuditFilter = { actor: '', action: '' };

/** Who did what, when and from where; nobody can change it. */
export function AuditScreen() {
  const me = useMe();
  return me.roles.includes('administrator') ? <Trail firmName={me.firm.name} /> : <NotThere />;
}

function Trail({ firmName }: { firmName: string }) {
  const [filter, setFilter] = useState(EVERYTHING);
  const settled = useSettled(filter, REST_MS) ?? EVERYTHING;
  const { data, error, refetch, fetchNextPage, hasNextPage, isFetchingNextPage } =
    useAudit(settled);
  const download = useAuditDownload();
  const rows = data?.pages.flatMap((page) => page.rows);
  const isNarrowed = settled.actor.trim() !== '' || settled.action.trim() !== '';
  return (
    <Screen
      title="Audit"
      crumbs={[{ label: firmName }]}
      lead="Every change, sign-in, download and refusal, newest first. Rows are chained by their hashes: none can be altered or taken out unnoticed."
      actions={
        <Button
          label="Save as CSV"
          busy={download.isPending}
          onPress={() => download.mutate(settled)}
        />
      }
    >
      {download.error ? (
        <ErrorState error={download.error} title="The file could not be saved" />
      ) : null}
      <Card>
        <View role="group" aria-label="Narrow the trail" style={styles.filters}>
          <View style={styles.filter}>
            <TextField
              label="Who"
              hint="Name, or a part of it."
              value={filter.actor}
              onChange={(actor) => setFilter({ ...filter, actor })}
            />
          </View>
          <View style={styles.filter}>
            <TextField
              label="Action"
              hint="For example run, or run.signed."
              value={filter.action}
              onChange={(action) => setFilter({ ...filter, action })}
            />
          </View>
        </View>
        {error && !rows ? (
          <ErrorState
            error={error}
            title="The trail could not be read"
            retry={() => void refetch()}
          />
        ) : null}
        {!rows && !error ? <Loading what="Reading the trail…" /> : null}
        {rows?.length === 0 ? (
          <Empty title={isNarrowed ? 'Nothing like that' : 'Nothing yet'}>
            {isNarrowed
              ? 'No row of the trail fits. Shorten or clear what you typed.'
              : 'What people of the firm do is written here as they do it.'}
          </Empty>
        ) : null}
        {rows?.length ? <AuditTable rows={rows} /> : null}
        {hasNextPage ? (
          <Button
            label="Earlier rows"
            busy={isFetchingNextPage}
            onPress={() => void fetchNextPage()}
          />
        ) : rows?.length ? (
          <Txt variant="small" tone="soft">
            This is the beginning of the trail.
          </Txt>
        ) : null}
      </Card>
    </Screen>
  );
}

const styles = StyleSheet.create({
  filters: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two },
  filter: { flexGrow: 1, flexBasis: 220, maxWidth: 360 },
});
