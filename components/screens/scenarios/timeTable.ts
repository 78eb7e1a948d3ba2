import { pasteTable } from '@/shared/scenarios/pasteTable';
import type { TableReading } from '@/shared/scenarios/types';
import { fromSi, UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { plain, type ColumnsReading } from './columnsText';

export type TableQuantity = 'flow' | 'stage' | 'opening';

export const QUANTITY_OF: Record<
  TableQuantity,
  Extract<Quantity, 'flow' | 'elevation' | 'depth'>
> = { flow: 'flow', stage: 'elevation', opening: 'depth' };

/** An opening is read as a stage is: a length. */
export const readAs = (quantity: TableQuantity): 'flow' | 'stage' =>
  quantity === 'flow' ? 'flow' : 'stage';

export const asColumns = ({
  times,
  values,
  startsAt,
  understood,
  faults,
}: TableReading): ColumnsReading => ({
  columns: [times, values],
  ...(startsAt !== undefined && { startsAt }),
  understood,
  faults,
});

/** A table against time from text; an empty text is an empty table. */
export const readTimeTable = (
  text: string,
  quantity: TableQuantity,
  unitSystem: UnitSystem,
): ColumnsReading =>
  text.trim() === ''
    ? { columns: [[], []], understood: '', faults: [] }
    : asColumns(pasteTable(text, { quantity: readAs(quantity), unitSystem }));

/** As it would be typed: hours and the study's unit, named in a heading line so that it reads back the same. */
export function writeTimeTable(
  [times, values]: readonly (readonly number[])[],
  quantity: TableQuantity,
  system: UnitSystem,
): string {
  if (times.length === 0) return '';
  const si = QUANTITY_OF[quantity];
  const rows = times.map(
    (time, row) => `${plain(time / 3600)}\t${plain(fromSi(values[row], si, system))}`,
  );
  return [`time, h\t${quantity}, ${UNITS[system][si].symbol}`, ...rows].join('\n');
}
