import { useMemo, useState } from 'react';
import { Card } from '@/components/ui/Card';
import { Checkbox } from '@/components/ui/Checkbox';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import {
  compareGeometries,
  type SectionComparison,
} from '@/shared/reaches/compare/compareGeometries';
import type { Section } from '@/shared/surveys/types';
import { formatNumber, formatQuantity, formatWithUnit } from '@/shared/units/format';
import { fromSi, UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { countFates, FATE_WORDS, nameOf } from './fateWords';
import { OverlaidSections } from './OverlaidSections';

interface ComparedSectionsProps {
  before: readonly Section[];
  after: readonly Section[];
  /** Of the earlier and the later one. */
  names: readonly [string, string];
}

/** What became of every section, and the chosen one drawn as it was and as it is. */
export function ComparedSections({ before, after, names }: ComparedSectionsProps) {
  const system = useUnitSystem();
  const rows = useMemo(() => compareGeometries(before, after), [before, after]);
  const [isAll, setIsAll] = useState(false);
  const different = rows.filter(({ fate }) => fate !== 'same');
  const shown = isAll || different.length === 0 ? rows : different;
  const [wanted, setWanted] = useState<string | null>(null);
  const chosen = shown.find((row) => nameOf(row) === wanted) ?? shown[0];
  return (
    <>
      <Txt role="status" strong>
        {different.length === 0 ? 'Both are the same, section by section.' : `${countFates(rows)}.`}
      </Txt>
      <Card title={nameOf(chosen)} aside={FATE_WORDS[chosen.fate]}>
        <OverlaidSections row={chosen} names={names} />
        <Txt>{sentence(chosen, system)}</Txt>
      </Card>
      <Card title="Sections">
        {different.length > 0 ? (
          <Checkbox
            label="Show those that are as they were, too"
            checked={isAll}
            onChange={setIsAll}
          />
        ) : null}
        <Table
          label="Sections compared"
          columns={columns(system)}
          rows={shown}
          rowKey={nameOf}
          isChosen={(row) => row === chosen}
          onRowPress={(row) => setWanted(nameOf(row))}
          maxHeight={420}
        />
        <Txt variant="small" tone="soft">
          Area is that between the bank marks of the earlier section below its lower bank; without
          marks, over the whole width below its lower end. Larger means more room for water.
        </Txt>
      </Card>
    </>
  );
}

const signed = (si: number | null, quantity: Quantity, system: UnitSystem, decimals: number) => {
  if (si === null) return '–';
  const text = formatNumber(fromSi(si, quantity, system), decimals);
  return si > 0 && /[1-9]/.test(text) ? `+${text}` : text;
};
const share = ({ areaChange, areaBefore }: SectionComparison) =>
  areaChange === null || !areaBefore
    ? '–'
    : `${areaChange > 0 ? '+' : ''}${formatNumber((100 * areaChange) / areaBefore, 1)} %`;

const columns = (system: UnitSystem): Column<SectionComparison>[] => [
  { key: 'name', title: 'Section', render: nameOf },
  { key: 'fate', title: 'What became of it', render: ({ fate }) => FATE_WORDS[fate] },
  {
    key: 'place',
    title: 'Chainage',
    unit: UNITS[system].chainage.symbol,
    align: 'right',
    render: ({ before, after }) => formatQuantity((after ?? before)!.chainage, 'chainage', system),
  },
  {
    key: 'thalweg',
    title: 'Lowest point',
    unit: UNITS[system].elevation.symbol,
    align: 'right',
    render: ({ thalwegChange }) => signed(thalwegChange, 'elevation', system, 2),
  },
  {
    key: 'area',
    title: 'Area below bank',
    unit: UNITS[system].area.symbol,
    align: 'right',
    render: ({ areaChange }) => signed(areaChange, 'area', system, 1),
  },
  { key: 'share', title: 'of it', align: 'right', render: share },
  { key: 'what', title: 'What differs', render: ({ changes }) => changes.join(', ') || '–' },
];

function sentence(row: SectionComparison, system: UnitSystem): string {
  const { fate, before, after, level, areaChange, thalwegChange } = row;
  if (!before) return 'There was no such section before.';
  if (!after) return 'It is not there any more.';
  const moved =
    fate === 'moved'
      ? `It stood at ${formatWithUnit(before.chainage, 'chainage', system)} and stands at ${formatWithUnit(after.chainage, 'chainage', system)}. `
      : '';
  const deeper =
    Math.abs(thalwegChange!) < 0.005
      ? 'The lowest point is as it was'
      : `The lowest point is ${formatWithUnit(Math.abs(thalwegChange!), 'elevation', system)} ${thalwegChange! < 0 ? 'deeper' : 'higher'}`;
  return `${moved}${deeper}; the area below ${formatWithUnit(level!, 'elevation', system)} changes by ${signed(areaChange, 'area', system, 1)} ${UNITS[system].area.symbol}, ${share(row)}.`;
}
