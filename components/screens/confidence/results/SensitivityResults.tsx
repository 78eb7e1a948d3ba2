import { useMemo, useState } from 'react';
import { Tornado } from '@/components/charts/Tornado';
import { Card } from '@/components/ui/Card';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { PARAMETERS } from '@/shared/confidence/parameters';
import { valueWords } from '@/shared/confidence/planMembers';
import type { PlaceValues, SensitivityResult } from '@/shared/confidence/types';
import { formatChosenLength } from '@/shared/units/format';
import { changeWords, VALUE_NAMES, valueText } from '@/shared/confidence/placeValueWords';
import { SensitivityTable } from './SensitivityTable';
import { StationField } from './StationField';

/** Which input moves what, at one station at a time. */
export function SensitivityResults({ result }: { result: SensitivityResult }) {
  const system = useUnitSystem();
  const [k, setStation] = useState(0);
  const [quantity, setQuantity] = useState<keyof PlaceValues>('peakStage');
  const base = result.base[k][quantity];
  const bars = useMemo(
    () =>
      result.rows.map(({ parameter, low, high }) => {
        const side = ({ value, stations }: typeof low) => {
          const there = stations?.[k][quantity] ?? null;
          return {
            words: valueWords(parameter, value, system),
            change: there === null || base === null ? null : there - base,
          };
        };
        return { label: PARAMETERS[parameter].label, low: side(low), high: side(high) };
      }),
    [result, k, quantity, base, system],
  );
  const { name } = result.stations[k];
  const label = `${VALUE_NAMES[quantity]} at ${name}`;
  return (
    <>
      <Card title="What moves it most">
        <StationField stations={result.stations} chosen={k} onChange={setStation} />
        <RadioGroup
          inline
          label="Change of"
          value={quantity}
          options={(Object.keys(VALUE_NAMES) as (keyof PlaceValues)[]).map((value) => ({
            value,
            label: VALUE_NAMES[value],
          }))}
          onChange={setQuantity}
        />
        <Txt>
          {`${label} in the base case: `}
          <Txt strong>{valueText(quantity, base, system)}</Txt>
          {`, on cells of ${formatChosenLength(result.cellSize, system)}. The line stands for it; an open bar is the lower value of the input, a full one the upper.`}
        </Txt>
        {base === null ? (
          <Txt tone="soft">The wave never comes there in the base case.</Txt>
        ) : (
          <Tornado
            label={`Change of ${label}`}
            bars={bars}
            format={(change) => changeWords(quantity, change, system)}
          />
        )}
      </Card>
      <SensitivityTable result={result} />
    </>
  );
}
