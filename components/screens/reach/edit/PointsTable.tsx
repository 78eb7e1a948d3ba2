import type { ClipboardEvent, CSSProperties } from 'react';
import { StyleSheet, View } from 'react-native';
import { radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { goBetweenCells } from '@/components/ui/goBetweenCells';
import { domTextStyle } from '@/components/ui/textStyle';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { UNITS } from '@/shared/units/units';
import { useEditing } from './editorContext';
import { PointCell } from './PointCell';
import { marksAt } from './marksAt';

interface PointsTableProps {
  chosen: number;
  onChoose: (index: number) => void;
  /** Text with several rows or columns was pasted into a cell. */
  onPaste: (row: number, column: 0 | 1, text: string) => void;
}

/** Rows on screen at once: a laser scan has thousands. */
const PAGE = 120;

/** The points of the section in figures: typed, pasted over, gone through with the arrow keys. */
export function PointsTable({ chosen, onChoose, onPaste }: PointsTableProps) {
  const { section } = useEditing();
  const { colours } = useTheme();
  const system = useUnitSystem();
  const { points } = section;
  const first = Math.floor(chosen / PAGE) * PAGE;
  const rows = points.slice(first, first + PAGE);
  const head: CSSProperties = {
    ...domTextStyle(colours, 'small', 'soft', true),
    textAlign: 'left',
    padding: `${space.half}px ${space.one}px`,
    position: 'sticky',
    top: 0,
    zIndex: 1,
    background: colours.card,
  };
  const paste = (event: ClipboardEvent, row: number, column: 0 | 1) => {
    const text = event.clipboardData.getData('text/plain');
    if (!/[\t\n;]/.test(text.trim())) return;
    event.preventDefault();
    onPaste(row, column, text);
  };
  return (
    <>
      <div
        role="group"
        aria-label={`Points of ${section.id}, table`}
        style={{ overflow: 'auto', maxHeight: 340, maxWidth: '100%' }}
        onKeyDown={goBetweenCells}
      >
        <table
          aria-label={`Points of ${section.id}, in figures`}
          style={{ borderCollapse: 'separate', borderSpacing: 0, width: '100%' }}
        >
          <thead>
            <tr>
              <th scope="col" style={head}>
                Point
              </th>
              <th scope="col" style={head}>
                Offset, {UNITS[system].length.symbol}
              </th>
              <th scope="col" style={head}>
                Elevation, {UNITS[system].elevation.symbol}
              </th>
              <th scope="col" style={head}>
                Mark
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map((_, i) => {
              const row = first + i;
              const ground = row === chosen ? colours.earthTint : colours.card;
              return (
                <tr key={row} aria-current={row === chosen || undefined}>
                  <th
                    scope="row"
                    style={{ ...domTextStyle(colours), background: ground, textAlign: 'left' }}
                  >
                    <button
                      type="button"
                      aria-label={`Choose point ${row + 1}`}
                      aria-pressed={row === chosen}
                      onClick={() => onChoose(row)}
                      style={{
                        all: 'unset',
                        cursor: 'pointer',
                        outline: 'revert',
                        minWidth: 36,
                        minHeight: 36,
                        lineHeight: '36px',
                        paddingLeft: space.one,
                        borderRadius: radius.small,
                        textDecoration: 'underline',
                      }}
                    >
                      {row + 1}
                    </button>
                  </th>
                  {([0, 1] as const).map((column) => (
                    <td key={column} style={{ background: ground, padding: 2 }}>
                      <PointCell
                        {...{ row, column }}
                        onFocus={() => onChoose(row)}
                        onPaste={(event) => paste(event, row, column)}
                      />
                    </td>
                  ))}
                  <td
                    style={{
                      ...domTextStyle(colours, 'small', 'soft'),
                      background: ground,
                      padding: `0 ${space.one}px`,
                      whiteSpace: 'nowrap',
                    }}
                  >
                    {marksAt(section, points[row][0]).join(', ')}
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      {points.length > PAGE ? (
        <View style={styles.pages}>
          <Button
            kind="quiet"
            label="Earlier points"
            disabled={first === 0}
            onPress={() => onChoose(first - 1)}
          />
          <Txt variant="small" tone="soft">
            {first + 1} to {first + rows.length} of {points.length}
          </Txt>
          <Button
            kind="quiet"
            label="Later points"
            disabled={first + PAGE >= points.length}
            onPress={() => onChoose(first + PAGE)}
          />
        </View>
      ) : null}
    </>
  );
}

const styles = StyleSheet.create({
  pages: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between' },
});
