import { useState, type ClipboardEvent } from 'react';
import { radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { parseTyped } from '@/components/ui/parseTyped';
import { domTextStyle } from '@/components/ui/textStyle';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { setPoint } from '@/shared/reaches/edit/setPoint';
import { fromSi, toSi, UNITS } from '@/shared/units/units';
import { useEditing } from './editorContext';

interface PointCellProps {
  row: number;
  /** 0 offset, 1 elevation. */
  column: 0 | 1;
  onFocus: () => void;
  onPaste: (event: ClipboardEvent) => void;
}

const QUANTITY = ['length', 'elevation'] as const;
const NAME = ['Offset', 'Elevation'] as const;

/** One figure of one point. What is typed is taken when the cell is left; what is no number stays to be mended. */
export function PointCell({ row, column, onFocus, onPaste }: PointCellProps) {
  const { section, put, faultAt, editor } = useEditing();
  const { colours } = useTheme();
  const system = useUnitSystem();
  const [typed, setTyped] = useState<string | null>(null);
  const cell = { sectionId: section.id, row, column };
  const unread = editor.unread.at(cell);
  const stored = shown(
    fromSi(section.points[row][column], QUANTITY[column], system),
    UNITS[system][QUANTITY[column]].decimals,
  );
  const fault =
    unread === undefined
      ? faultAt(`points[${row}][${column}]`)
      : `“${unread}” is not a number. Before it stood ${stored}.`;
  const faultId = `fault-${row}-${column}`;

  const leave = () => {
    if (typed === null) return;
    setTyped(null);
    const number = parseTyped(typed);
    if (number === null || Number.isNaN(number)) return editor.unread.set(cell, typed);
    editor.unread.set(cell, null);
    if (typed === stored) return;
    const point: [number, number] = [...section.points[row]];
    point[column] = toSi(number, QUANTITY[column], system);
    put(setPoint(section, row, point), `point ${row + 1} typed`);
  };
  return (
    <>
      <input
        type="text"
        inputMode="decimal"
        data-cell={`${row}/${column}`}
        aria-label={`${NAME[column]} of point ${row + 1}, ${UNITS[system][QUANTITY[column]].symbol}`}
        aria-invalid={fault ? true : undefined}
        aria-describedby={fault ? faultId : undefined}
        value={typed ?? unread ?? stored}
        onFocus={onFocus}
        onChange={({ target }) => setTyped(target.value)}
        onBlur={leave}
        onPaste={onPaste}
        style={{
          ...domTextStyle(colours, 'lead'),
          width: '100%',
          minWidth: 76,
          boxSizing: 'border-box',
          minHeight: 36,
          textAlign: 'right',
          padding: `0 ${space.one}px`,
          border: fault ? `2px solid ${colours.brick}` : `1px solid ${colours.edge}`,
          borderRadius: radius.small,
          background: colours.card,
        }}
      />
      {fault ? (
        <div id={faultId} role="alert" style={domTextStyle(colours, 'small', 'brick', true)}>
          {fault}
        </div>
      ) : null}
    </>
  );
}

/** At least the decimals that the quantity deserves, so that figures line up; at most three. */
const shown = (value: number, least: number): string =>
  Number.isFinite(value)
    ? value.toFixed(Math.max(least, String(Number(value.toFixed(3))).split('.')[1]?.length ?? 0))
    : '';
