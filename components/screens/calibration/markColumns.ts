import type { Column } from '@/components/ui/Table';
import { CONFIDENCE_WORDS, KIND_WORDS } from '@/shared/calibration/marks';
import type { Mark } from '@/shared/calibration/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { floodName } from './floodWords';

type Shown = Omit<Mark, 'id'>;

export const placeColumn = <Row extends { chainage: number }>(system: UnitSystem): Column<Row> => ({
  key: 'place',
  title: 'Chainage',
  render: ({ chainage }) => formatWithUnit(chainage, 'chainage', system),
});

/** A mark, a column a fact. */
export function markColumns<Row extends Shown>(system: UnitSystem): Column<Row>[] {
  return [
    placeColumn(system),
    {
      key: 'level',
      title: 'Level',
      unit: UNITS[system].elevation.symbol,
      align: 'right',
      render: ({ level }) => formatQuantity(level, 'elevation', system),
    },
    { key: 'kind', title: 'Kind', render: ({ kind }) => KIND_WORDS[kind] },
    {
      key: 'confidence',
      title: 'Confidence',
      render: ({ confidence }) => CONFIDENCE_WORDS[confidence],
    },
    { key: 'flood', title: 'Flood', render: ({ flood }) => floodName(flood) },
    { key: 'day', title: 'Seen', render: ({ observedOn }) => observedOn ?? '–' },
    { key: 'note', title: 'Note', render: ({ note }) => note || '–' },
  ];
}
