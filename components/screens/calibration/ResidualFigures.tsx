import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { toleranceSource } from '@/shared/calibration/marks';
import type { RunResiduals } from '@/shared/calibration/types';
import { formatNumber, formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { floodName, signed } from './floodWords';

type Shown = Pick<RunResiduals, 'all' | 'misfit' | 'marks'>;

/** The figures that a reviewer asks for first. */
export function ResidualFigures({ residuals }: { residuals: Shown & { flood: string } }) {
  return (
    <Card title={floodName(residuals.flood)}>
      <Figures residuals={residuals} />
      <Txt variant="small" tone="soft">
        {toleranceSource(useUnitSystem())}
      </Txt>
    </Card>
  );
}

export function Figures({ residuals: { all, misfit } }: { residuals: Shown }) {
  const system = useUnitSystem();
  const unit = UNITS[system].depth.symbol;
  const length = (value: number) => formatQuantity(value, 'depth', system);
  return (
    <View style={styles.row}>
      {all ? (
        <>
          <FigureWithUnit
            value={signed(length(all.mean), all.mean)}
            unit={unit}
            label="mean error of the marks"
          />
          <FigureWithUnit value={length(all.rms)} unit={unit} label="root mean square" />
          <FigureWithUnit
            value={`${all.within} of ${all.count}`}
            label="marks within their tolerance"
          />
        </>
      ) : null}
      <FigureWithUnit
        value={misfit === null ? '–' : formatNumber(misfit, 2)}
        label="misfit; 1: off by the tolerance on average"
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.four, rowGap: space.two },
});
