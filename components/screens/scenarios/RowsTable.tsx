import { useEffect, useRef, useState, type ClipboardEvent, type CSSProperties } from 'react';
import { View } from 'react-native';
import { radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { goBetweenCells } from '@/components/ui/goBetweenCells';
import { domTextStyle } from '@/components/ui/textStyle';
import {
  addRow,
  cutRows,
  joinRows,
  pasteCells,
  removeRow,
  setCell,
  type TypedRows,
} from './rowsText';

interface RowsTableProps {
  label: string;
  columns: readonly { title: string; unit: string }[];
  /** As it is typed, with tabs. */
  text: string;
  onText: (text: string) => void;
  /** Rows in which something is wrong, from 0. */
  faulty: ReadonlySet<number>;
}

/** The text of a table as rows of fields: typed, pasted over, added and removed, all by keyboard as well. */
export function RowsTable({ label, columns, text, onText, faulty }: RowsTableProps) {
  const { colours } = useTheme();
  const heading = columns.map(({ title, unit }) => `${title} ${unit}`).join('\t');
  const rows = cutRows(text, heading, columns.length);
  const last = rows.cells.length - 1;
  const [at, setAt] = useState(last);
  const box = useRef<HTMLDivElement>(null);
  // A row that was added is where one goes on.
  const wanted = useRef<number | null>(null);
  useEffect(() => {
    if (wanted.current === null) return;
    box.current?.querySelector<HTMLInputElement>(`[data-cell="${wanted.current}/0"]`)?.focus();
    wanted.current = null;
  });

  const put = (next: TypedRows) => onText(joinRows(next));
  const add = (below: number) => {
    wanted.current = below + 1;
    put(addRow(rows, below));
  };
  const paste = (event: ClipboardEvent, row: number, column: number) => {
    const pasted = event.clipboardData.getData('text/plain');
    if (!/[\t\n]/.test(pasted.trim())) return;
    event.preventDefault();
    put(pasteCells(rows, row, column, pasted));
  };
  const head: CSSProperties = {
    ...domTextStyle(colours, 'small', 'soft', true),
    textAlign: 'left',
    padding: `${space.half}px ${space.half}px`,
  };
  return (
    <>
      <div
        ref={box}
        role="group"
        aria-label={`${label}, rows`}
        style={{ overflow: 'auto', maxHeight: 380, maxWidth: '100%' }}
        onKeyDown={(event) => {
          const cell = (event.target as HTMLElement).dataset['cell'];
          if (event.key === 'Enter' && cell?.startsWith(`${last}/`)) {
            event.preventDefault();
            add(last);
          } else goBetweenCells(event);
        }}
      >
        <table aria-label={`${label}, in rows`} style={{ borderSpacing: 0, width: '100%' }}>
          <thead>
            <tr>
              {columns.map(({ title, unit }) => (
                <th key={title} scope="col" style={head}>
                  {`${title}, ${unit}`}
                </th>
              ))}
              <th scope="col" style={head}>
                Row
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.cells.map((cells, row) => (
              <tr key={row}>
                {cells.map((typed, column) => (
                  <td key={column} style={{ padding: 2 }}>
                    <input
                      type="text"
                      inputMode="decimal"
                      data-cell={`${row}/${column}`}
                      aria-label={`${columns[column].title}, row ${row + 1}, ${columns[column].unit}`}
                      aria-invalid={faulty.has(row) || undefined}
                      value={typed}
                      onFocus={() => setAt(row)}
                      onChange={({ target }) => put(setCell(rows, row, column, target.value))}
                      onPaste={(event) => paste(event, row, column)}
                      style={{
                        ...domTextStyle(colours, 'lead'),
                        width: '100%',
                        minWidth: 76,
                        minHeight: 40,
                        boxSizing: 'border-box',
                        textAlign: 'right',
                        padding: `0 ${space.one}px`,
                        border: `${faulty.has(row) ? 2 : 1}px solid ${faulty.has(row) ? colours.brick : colours.edge}`,
                        borderRadius: radius.small,
                        background: colours.card,
                      }}
                    />
                  </td>
                ))}
                <td style={{ padding: `0 ${space.half}px`, width: 1 }}>
                  <Button
                    kind="quiet"
                    label="Remove"
                    name={`Remove row ${row + 1} of ${label}`}
                    onPress={() => put(removeRow(rows, row))}
                  />
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <View>
        <Button
          label={at < last ? `Add a row below row ${at + 1}` : 'Add a row'}
          name={`${at < last ? `Add a row below row ${at + 1}` : 'Add a row'}, ${label}`}
          onPress={() => add(Math.min(at, last))}
        />
      </View>
    </>
  );
}
