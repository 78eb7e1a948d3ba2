import type { CSSProperties, ReactNode } from 'react';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { domTextStyle } from './textStyle';
import { Txt } from './Txt';

export interface Column<Row> {
  key: string;
  title: string;
  unit?: string;
  /** Numbers stand to the right. */
  align?: 'left' | 'right';
  render: (row: Row) => ReactNode;
}

interface TableProps<Row> {
  /** What the table holds, for screen readers. */
  label: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string | number;
  /** The row one is at. */
  isChosen?: (row: Row) => boolean;
  onRowPress?: (row: Row) => void;
  /** Scrolls within this height, heading row fixed. */
  maxHeight?: number;
}

/** The browser's own table, for its columns and its reading aloud; scrolls in its own box, first column fixed. */
export function Table<Row>(props: TableProps<Row>) {
  const { label, columns, rows, rowKey, isChosen, onRowPress, maxHeight } = props;
  const { colours } = useTheme();
  const cell = (column: Column<Row>, index: number, ground: string): CSSProperties => ({
    padding: `${space.one}px ${space.one * 1.5}px`,
    textAlign: column.align ?? 'left',
    borderBottom: `1px solid ${colours.line}`,
    background: ground,
    whiteSpace: index === 0 ? 'normal' : 'nowrap',
    minWidth: index === 0 ? 112 : undefined,
    ...(index === 0 ? { position: 'sticky', left: 0, zIndex: 1 } : null),
  });
  return (
    <div
      role="group"
      aria-label={`${label}, table`}
      tabIndex={0}
      style={{ overflow: 'auto', maxHeight, maxWidth: '100%', minWidth: 0 }}
    >
      <table
        aria-label={label}
        style={{ borderCollapse: 'separate', borderSpacing: 0, width: '100%' }}
      >
        <thead>
          <tr>
            {columns.map((column, i) => (
              <th
                key={column.key}
                scope="col"
                style={{
                  ...domTextStyle(colours, 'small', 'soft', true),
                  ...cell(column, i, colours.card),
                  position: 'sticky',
                  top: 0,
                  zIndex: i === 0 ? 3 : 2,
                }}
              >
                {column.title}
                {column.unit ? `, ${column.unit}` : ''}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => {
            const chosen = isChosen?.(row) ?? false;
            const ground = chosen ? colours.earthTint : colours.card;
            return (
              <tr
                key={rowKey(row)}
                aria-current={chosen || undefined}
                onClick={onRowPress && (() => onRowPress(row))}
                style={{ cursor: onRowPress ? 'pointer' : undefined }}
              >
                {columns.map((column, i) => {
                  const Cell = i === 0 ? 'th' : 'td';
                  return (
                    <Cell
                      key={column.key}
                      scope={i === 0 ? 'row' : undefined}
                      style={{ ...domTextStyle(colours), ...cell(column, i, ground) }}
                    >
                      {i === 0 && onRowPress ? (
                        <RowButton onPress={() => onRowPress(row)}>{column.render(row)}</RowButton>
                      ) : (
                        column.render(row)
                      )}
                    </Cell>
                  );
                })}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

/** A row that can be pressed has a button in its first cell: the keyboard needs something to stand on. */
function RowButton({ children, onPress }: { children: ReactNode; onPress: () => void }) {
  return (
    <button
      type="button"
      onClick={(event) => {
        event.stopPropagation();
        onPress();
      }}
      style={{
        all: 'unset',
        cursor: 'pointer',
        display: 'block',
        minHeight: 24,
        outline: 'revert',
      }}
    >
      {typeof children === 'string' ? (
        <Txt style={{ textDecorationLine: 'underline' }}>{children}</Txt>
      ) : (
        children
      )}
    </button>
  );
}
