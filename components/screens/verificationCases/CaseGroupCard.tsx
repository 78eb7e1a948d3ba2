import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import { space, touch } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import type { CaseGroup, VerificationCaseRow } from '@/shared/verificationCases/types';
import { GROUP_WORDS } from '@/shared/verificationCases/words';
import { errorWords, stateOf } from './caseWords';

/** The cases of one kind, each with its verdict. */
export function CaseGroupCard({
  group,
  rows,
}: {
  group: CaseGroup;
  rows: readonly VerificationCaseRow[];
}) {
  const within = rows.filter(({ result }) => result?.within).length;
  return (
    <Card title={GROUP_WORDS[group]} aside={`${within} of ${rows.length} within bounds`}>
      <List label={GROUP_WORDS[group]}>
        {rows.map((row) => (
          <CaseLine key={row.id} row={row} />
        ))}
      </List>
    </Card>
  );
}

function CaseLine({ row }: { row: VerificationCaseRow }) {
  const { label, tone } = stateOf(row);
  const errors = errorWords(row);
  return (
    <Link href={{ pathname: '/proof/[caseId]', params: { caseId: row.id } }} asChild>
      <Pressable role="link" style={styles.line}>
        <View style={styles.names}>
          <Txt strong>{row.title}</Txt>
          {errors ? (
            <Txt variant="small" tone="soft">
              {errors}
            </Txt>
          ) : null}
          {row.latest?.failure ? (
            <Txt variant="small" tone="brick">
              {row.latest.failure}
            </Txt>
          ) : null}
        </View>
        <View style={styles.state}>
          <Badge label={label} tone={tone} />
          {row.result?.isCurrent === false ? (
            <Badge label={`Solver ${row.result.solver}, older`} tone="ochre" />
          ) : null}
        </View>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  line: {
    minHeight: touch,
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'center',
    alignContent: 'center',
    columnGap: space.two,
    rowGap: space.half,
  },
  names: { flexGrow: 1, flexShrink: 1, flexBasis: 180, minWidth: 0 },
  state: { flexDirection: 'row', flexWrap: 'wrap', gap: space.half },
});
