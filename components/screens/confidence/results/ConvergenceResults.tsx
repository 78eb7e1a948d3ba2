import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { BandChart } from '@/components/charts/BandChart';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ConvergenceResult } from '@/shared/confidence/types';
import { formatNumber, formatChosenLength, formatWithUnit } from '@/shared/units/format';
import { fromSi, UNITS } from '@/shared/units/units';
import { ConvergenceTable } from './ConvergenceTable';

/** m between the finest two grids that is good (common practice), as the checklist has it. */
const GOOD = 0.05;

/** What the cells cost. */
export function ConvergenceResults({ result }: { result: ConvergenceResult }) {
  const system = useUnitSystem();
  const { along, grids, widest } = result;
  const difference = Math.abs(widest.difference);
  const unit = UNITS[system].depth;
  const shown = (si: number) => formatNumber(fromSi(si, 'depth', system), 3);
  const lost = grids.filter(({ cells }) => cells === null).length;
  const sizes = grids.map(({ cellSize, cells }) =>
    cellSize === null
      ? 'one that failed'
      : `${formatChosenLength(cellSize, system)} (${cells} cells)`,
  );
  return (
    <>
      <Card title="What the cells cost">
        <View style={styles.figures}>
          <FigureWithUnit
            value={shown(difference)}
            unit={unit.symbol}
            label={`largest difference of peak stage between the finest two grids, at ${formatWithUnit(widest.chainage, 'chainage', system)}`}
            tone={difference <= GOOD ? undefined : 'ochre'}
          />
          <FigureWithUnit
            value={along.order === null ? '–' : formatNumber(along.order, 1)}
            label={`observed order of the peak stage, middle of the reach's places; the scheme is of second order in smooth flow`}
          />
        </View>
        <Txt>
          {`Grids of ${sizes.join(', ')}. At ${formatNumber(100 * along.monotone, 0)} % of the places the three approach one value from one side; only there an order and an index mean something.`}
        </Txt>
        <Notice tone={difference <= GOOD ? 'done' : 'attention'} still>
          {difference <= GOOD
            ? `The finest two grids agree within ${formatWithUnit(GOOD, 'depth', system)} everywhere: the cells are fine enough for levels (common practice).`
            : `The finest two grids differ by more than ${formatWithUnit(GOOD, 'depth', system)} (common practice): use smaller cells, or say why these are enough.`}
        </Notice>
        {lost > 0 ? (
          <Notice tone="attention" still>
            Without all three grids there is no order and no index; only differences are told.
          </Notice>
        ) : null}
      </Card>
      <DifferenceCard result={result} />
      <ConvergenceTable result={result} />
    </>
  );
}

/** Peak stage of the second grid less that of the finest, along the reach. */
function DifferenceCard({ result: { along } }: { result: ConvergenceResult }) {
  const system = useUnitSystem();
  const [at, setAt] = useState<number | null>(null);
  const data = useMemo(() => ({ x: along.chainage, line: along.difference, band: null }), [along]);
  return (
    <Card title="Difference along the reach" aside={UNITS[system].depth.symbol}>
      <BandChart
        label="Peak stage on the second grid less that on the finest, along the reach"
        axis="chainage"
        quantity="depth"
        data={data}
        names={{ line: 'difference' }}
        at={at}
        onChange={setAt}
        unitSystem={system}
      />
      <Txt variant="small" tone="soft">
        Above zero the coarser grid stands higher. Each place is in the file.
      </Txt>
    </Card>
  );
}

const styles = StyleSheet.create({
  figures: { flexDirection: 'row', flexWrap: 'wrap', gap: space.three },
});
