import { Table } from '@/components/ui/Table';
import type { ColumnMatch, MatchChoice } from '@/shared/surveys/types';
import { FIELD_NAMES, headingOf, UNIT_NAMES, type SheetGroup } from './matchChoice';

interface MatchTableProps {
  label: string;
  group: SheetGroup;
  choice: MatchChoice;
}

/** What each column was taken for, with its first values. */
export function MatchTable({ label, group, choice }: MatchTableProps) {
  const meaning = ({ column }: ColumnMatch): string => {
    const entry = choice.columns.find((one) => one.column === column);
    if (!entry?.field) return 'passed over';
    return entry.unit
      ? `${FIELD_NAMES[entry.field]}, ${UNIT_NAMES[entry.unit]}`
      : FIELD_NAMES[entry.field];
  };
  return (
    <Table
      label={`Columns of ${label}`}
      rows={group.columns}
      rowKey={({ column }) => column}
      columns={[
        { key: 'heading', title: 'Heading', render: headingOf },
        { key: 'means', title: 'Taken for', render: meaning },
        {
          key: 'sample',
          title: 'First values',
          render: ({ sample }) => sample.slice(0, 4).join(' · ') || 'empty',
        },
      ]}
    />
  );
}
