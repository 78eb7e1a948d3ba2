import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { AuditRow } from '@/shared/audit/types';
import { auditClock } from './auditClock';

/** Rows of the trail as they were written. */
export function AuditTable({ rows }: { rows: AuditRow[] }) {
  return <Table label="Audit trail" columns={COLUMNS} rows={rows} rowKey={({ id }) => id} />;
}

const COLUMNS: Column<AuditRow>[] = [
  { key: 'at', title: 'When', render: ({ at }) => auditClock(at) },
  { key: 'actor', title: 'Who', render: ({ actor }) => actor ?? 'nobody signed in' },
  {
    key: 'what',
    title: 'What',
    render: ({ action, words, outcome }) => (
      <View style={styles.what}>
        <Txt>{words}</Txt>
        <View style={styles.action}>
          <Txt variant="small" tone="soft">
            {action}
          </Txt>
          {outcome === 'refused' ? <Badge label="Refused" tone="brick" /> : null}
        </View>
      </View>
    ),
  },
  {
    key: 'record',
    title: 'Record',
    render: ({ record }) => (record ? `${record.kind} ${record.id}` : '–'),
  },
  { key: 'from', title: 'From', render: ({ from }) => from ?? '–' },
  {
    key: 'hash',
    title: 'Hash',
    // Enough to compare by eye; the file holds the whole.
    render: ({ hash }) => <span title={hash}>{hash.slice(0, 12)}</span>,
  },
];

const styles = StyleSheet.create({
  what: { minWidth: 260, maxWidth: 460 },
  action: { flexDirection: 'row', alignItems: 'center', columnGap: space.one, flexWrap: 'wrap' },
});
