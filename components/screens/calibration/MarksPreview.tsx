import { Table } from '@/components/ui/Table';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Mark } from '@/shared/calibration/types';
import { markColumns } from './markColumns';

/** Marks as they were understood. */
export function MarksPreview({ marks }: { marks: readonly Omit<Mark, 'id'>[] }) {
  const system = useUnitSystem();
  const rows = marks.map((mark, row) => ({ ...mark, row }));
  return (
    <Table
      label="Marks as understood"
      columns={markColumns<(typeof rows)[number]>(system)}
      rows={rows}
      rowKey={({ row }) => row}
      maxHeight={220}
    />
  );
}
