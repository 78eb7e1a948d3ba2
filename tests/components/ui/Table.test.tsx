import { fireEvent, render, screen, within } from '@testing-library/react';
import { Table } from '@/components/ui/Table';

const rows = [
  { id: 1, name: 'Tornick bridge', stage: 44.66 },
  { id: 2, name: 'Sallow Mill', stage: 40.71 },
];

function show(onRowPress?: (row: (typeof rows)[number]) => void) {
  render(
    <Table
      label="Peaks"
      rows={rows}
      rowKey={(row) => row.id}
      isChosen={(row) => row.id === 2}
      onRowPress={onRowPress}
      columns={[
        { key: 'name', title: 'Station', render: (row) => row.name },
        {
          key: 'stage',
          title: 'Peak stage',
          unit: 'm',
          align: 'right',
          render: (row) => row.stage.toFixed(2),
        },
      ]}
    />,
  );
}

test('is a table to a screen reader, with headings of columns and rows and the unit in the heading', () => {
  show();
  const table = screen.getByRole('table', { name: 'Peaks' });
  expect(within(table).getByRole('columnheader', { name: 'Peak stage, m' })).toBeTruthy();
  expect(within(table).getByRole('rowheader', { name: 'Sallow Mill' })).toBeTruthy();
  expect(within(table).getByRole('cell', { name: '44.66' })).toBeTruthy();
});

test('a row that can be chosen is told once, by pointer or by keyboard', () => {
  const press = jest.fn();
  show(press);
  fireEvent.click(screen.getByRole('button', { name: 'Sallow Mill' }));
  expect(press).toHaveBeenCalledTimes(1);
  expect(press).toHaveBeenCalledWith(rows[1]);
  fireEvent.click(screen.getByRole('cell', { name: '44.66' }));
  expect(press).toHaveBeenLastCalledWith(rows[0]);
});

test('says which row one is at', () => {
  show();
  expect(screen.getByRole('row', { current: true })).toBe(
    screen.getByRole('rowheader', { name: 'Sallow Mill' }).closest('tr'),
  );
});
