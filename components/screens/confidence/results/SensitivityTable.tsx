import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { PARAMETERS } from '@/shared/confidence/parameters';
import { valueWords } from '@/shared/confidence/planMembers';
import type { PlaceValues, SensitivityResult } from '@/shared/confidence/types';
import type { UnitSystem } from '@/shared/units/units';
import { changeWords, VALUE_NAMES, valueText } from '@/shared/confidence/placeValueWords';

interface Row {
  station: string;
  input: string;
  values: PlaceValues | null;
  base: PlaceValues;
  isBase: boolean;
}

/** The numbers behind the bars, of every station. */
export function SensitivityTable({ result }: { result: SensitivityResult }) {
  const system = useUnitSystem();
  const rows = result.stations.flatMap(({ name }, k): Row[] => [
    {
      station: name,
      input: 'Base case',
      values: result.base[k],
      base: result.base[k],
      isBase: true,
    },
    ...result.rows.flatMap(({ parameter, low, high }) =>
      [low, high].map((side) => ({
        station: name,
        input: `${PARAMETERS[parameter].label} ${valueWords(parameter, side.value, system)}`,
        values: side.stations?.[k] ?? null,
        base: result.base[k],
        isBase: false,
      })),
    ),
  ]);
  return (
    <Card title="The numbers">
      <Table
        label="Sensitivity at the stations"
        columns={columns(system)}
        rows={rows}
        rowKey={({ station, input }) => `${station} ${input}`}
        maxHeight={520}
      />
    </Card>
  );
}

const columns = (system: UnitSystem): Column<Row>[] => [
  { key: 'input', title: 'Input', render: ({ input }) => input },
  { key: 'station', title: 'Station', render: ({ station }) => station },
  ...(Object.keys(VALUE_NAMES) as (keyof PlaceValues)[]).flatMap((quantity): Column<Row>[] => [
    {
      key: quantity,
      title: VALUE_NAMES[quantity],
      align: 'right',
      render: ({ values }) => (values ? valueText(quantity, values[quantity], system) : 'failed'),
    },
    {
      key: `${quantity} change`,
      title: 'Change',
      align: 'right',
      render: ({ values, base, isBase }) => {
        const [here, there] = [values?.[quantity] ?? null, base[quantity]];
        return isBase || here === null || there === null
          ? '–'
          : changeWords(quantity, here - there, system);
      },
    },
  ]),
];
