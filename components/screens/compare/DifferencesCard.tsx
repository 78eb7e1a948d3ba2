import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { InputDifference, RunComparison } from '@/shared/comparison/types';

/** Which inputs make the difference, line by line. */
export function DifferencesCard({ comparison }: { comparison: RunComparison }) {
  const { runs, differences, differencesNotListed } = comparison;
  return (
    <Card
      title="What went in differently"
      aside={String(differences.length + differencesNotListed)}
    >
      {differences.length === 0 ? (
        <Txt>Nothing: the runs were given the same inputs.</Txt>
      ) : (
        <Table
          label="Inputs that differ"
          rows={differences}
          rowKey={({ part, what }) => `${part} ${what}`}
          maxHeight={460}
          columns={[
            { key: 'what', title: 'Input', render: ({ part, what }) => `${part}, ${what}` },
            ...runs.map(({ id, number }, i) => ({
              key: String(id),
              title: `Run ${number}`,
              render: ({ values }: InputDifference) => values[i] ?? 'none',
            })),
          ]}
        />
      )}
      {differencesNotListed > 0 ? (
        <Txt variant="small" tone="soft">{`And ${differencesNotListed} more.`}</Txt>
      ) : null}
    </Card>
  );
}
