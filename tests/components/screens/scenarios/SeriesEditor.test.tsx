import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useState, type ReactElement } from 'react';
import { createQueryClient } from '@/components/queries/queryClient';
import { SeriesEditor } from '@/components/screens/scenarios/SeriesEditor';
import { readTimeTable, writeTimeTable } from '@/components/screens/scenarios/timeTable';
import type { ColumnsReading } from '@/components/screens/scenarios/columnsText';

function Bench(props: { start?: number[][]; readFile?: (file: File) => Promise<ColumnsReading> }) {
  const [values, setValues] = useState<number[][]>(props.start ?? [[], []]);
  return (
    <>
      <SeriesEditor
        label="Inflow table"
        columns={[
          { title: 'time', unit: 'h', show: (s) => String(s / 3600) },
          { title: 'flow', unit: 'm³/s', show: String },
        ]}
        values={values}
        onChange={setValues}
        read={(text) => readTimeTable(text, 'flow', 'metric')}
        write={(columns) => writeTimeTable(columns, 'flow', 'metric')}
        readFile={props.readFile}
        error={values[0].length === 0 ? 'Paste the inflow.' : undefined}
      />
      <pre>{JSON.stringify(values)}</pre>
    </>
  );
}

const show = (bench: ReactElement) =>
  render(<QueryClientProvider client={createQueryClient()}>{bench}</QueryClientProvider>);
const box = () => screen.getByRole('textbox', { name: /Inflow table/ });
const type = (text: string) => fireEvent.change(box(), { target: { value: text } });
const values = () => JSON.parse(screen.getByText(/^\[\[/).textContent ?? '');

describe('a table of values', () => {
  it('asks for it while it is empty, and takes a text as soon as it can be read', () => {
    show(<Bench />);
    expect(screen.getByText('Paste the inflow.')).toBeTruthy();
    type('0\t55\n2\t90,5');
    expect(values()).toEqual([
      [0, 7200],
      [55, 90.5],
    ]);
    expect(screen.getByRole('status').textContent).toMatch(/^2 rows; times in hours/);
  });

  it('keeps the values and the text, and says what is wrong line by line', () => {
    show(<Bench start={[[0], [55]]} />);
    fireEvent.click(screen.getByRole('button', { name: 'Edit the values, Inflow table' }));
    type('0\t55\n2\tx');
    expect(values()).toEqual([[0], [55]]);
    expect(screen.getByText(/Line 2/)).toBeTruthy();
    expect(screen.getByText(/the values stay as they were/)).toBeTruthy();
    expect((box() as HTMLTextAreaElement).value).toBe('0\t55\n2\tx');
  });

  it('is typed row by row: rows are added by Enter, mended, pasted over and removed', () => {
    show(<Bench />);
    fireEvent.click(screen.getByRole('button', { name: 'Row by row, Inflow table' }));
    const cell = (column: 'time' | 'flow', row: number) =>
      screen.getByRole('textbox', { name: new RegExp(`^${column}, row ${row},`) });
    const put = (column: 'time' | 'flow', row: number, value: string) =>
      fireEvent.change(cell(column, row), { target: { value } });
    put('time', 1, '0');
    expect(screen.getByText('Row 1 has no value.')).toBeTruthy();
    put('flow', 1, '55');
    expect(values()).toEqual([[0], [55]]);
    fireEvent.keyDown(cell('flow', 1), { key: 'Enter' });
    expect(document.activeElement).toBe(cell('time', 2));
    // An empty row is none yet.
    expect(values()).toEqual([[0], [55]]);
    const clipboardData = { getData: () => '2\t90\n3\t70\n' };
    fireEvent.paste(cell('time', 2), { clipboardData });
    expect(values()).toEqual([
      [0, 7200, 10_800],
      [55, 90, 70],
    ]);
    put('flow', 2, 'x');
    expect(cell('flow', 2).getAttribute('aria-invalid')).toBe('true');
    expect(values()[1]).toEqual([55, 90, 70]);
    fireEvent.click(screen.getByRole('button', { name: 'Remove row 2 of Inflow table' }));
    expect(values()).toEqual([
      [0, 10_800],
      [55, 70],
    ]);
    fireEvent.click(screen.getByRole('button', { name: 'As text, to paste, Inflow table' }));
    expect((box() as HTMLTextAreaElement).value.split('\n')).toHaveLength(3);
  });

  it('shows the values as a table', () => {
    show(
      <Bench
        start={[
          [0, 3600],
          [55, 60],
        ]}
      />,
    );
    fireEvent.click(screen.getByRole('button', { name: /^Show the table/ }));
    const rows = screen.getAllByRole('row').map((row) => row.textContent);
    expect(rows).toEqual(['time, hflow, m³/s', '055', '160']);
  });

  it('takes a file without faults, and keeps the values when it has some', async () => {
    const answers: ColumnsReading[] = [
      {
        columns: [],
        understood: '',
        faults: [{ path: 'rows[2]', message: 'Row 2 has no value.' }],
      },
      { columns: [[0], [7]], understood: '1 rows; times in hours.', faults: [] },
    ];
    show(<Bench start={[[0], [55]]} readFile={async () => answers.shift()!} />);
    const choose = () =>
      fireEvent.change(document.querySelector('input[type=file]')!, {
        target: { files: [new File(['x'], 'flow.csv')] },
      });
    choose();
    await waitFor(() => expect(screen.getByText('Row 2 has no value.')).toBeTruthy());
    expect(values()).toEqual([[0], [55]]);
    choose();
    await waitFor(() => expect(values()).toEqual([[0], [7]]));
  });
});
