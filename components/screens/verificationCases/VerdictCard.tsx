import { StyleSheet, View } from 'react-native';
import { Badge } from '@/components/ui/Badge';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { Criterion, VerificationCaseRow } from '@/shared/verificationCases/types';
import { boundText, measuredText, MEASURE_WORDS } from '@/shared/verificationCases/words';

const COLUMNS: Column<Criterion>[] = [
  { key: 'measure', title: 'On the finest grid', render: ({ measure }) => MEASURE_WORDS[measure] },
  {
    key: 'within',
    title: 'Verdict',
    render: ({ within }) => (
      <View style={styles.badge}>
        <Badge label={within ? 'Within' : 'Outside'} tone={within ? 'moss' : 'brick'} />
      </View>
    ),
  },
  { key: 'value', title: 'Found', align: 'right', render: measuredText },
  { key: 'bound', title: 'Bound', align: 'right', render: boundText },
];

/** Each bound, what was found, and why the bound stands there. */
export function VerdictCard({
  row,
  criteria,
}: {
  row: VerificationCaseRow;
  criteria: readonly Criterion[];
}) {
  return (
    <Card title="Verdict">
      <Table
        label={`Bounds of ${row.title}`}
        columns={COLUMNS}
        rows={criteria}
        rowKey={({ measure }) => measure}
      />
      <Txt variant="small" tone="soft">
        {row.boundReason}
      </Txt>
    </Card>
  );
}

const styles = StyleSheet.create({ badge: { flexDirection: 'row' } });
