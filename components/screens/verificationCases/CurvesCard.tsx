import { useState } from 'react';
import { StyleSheet } from 'react-native';
import { Comparison } from '@/components/charts/Comparison';
import type { ComparedQuantity } from '@/components/charts/geometry/comparisonModel';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import type { CaseCurves } from '@/shared/verificationCases/types';
import { ValuesTable } from './ValuesTable';

interface Props {
  title: string;
  curves: CaseCurves;
  quantity: ComparedQuantity;
}

const WORDS = { stage: ['Stage', 'm'], flow: ['Flow', 'm³/s'] } as const;

/** Computed over exact; the values behind it one press away. */
export function CurvesCard({ title, curves, quantity }: Props) {
  const [asTable, setAsTable] = useState(false);
  const [word, unit] = WORDS[quantity];
  const name = `${word}, ${title}`;
  const along = curves.along === 'time' ? 'against time' : 'along chainage, m';
  return (
    <Card
      title={word}
      style={styles.card}
      aside={
        <>
          <Txt tone="soft">{`${unit}, ${along}`}</Txt>
          <Button
            kind="quiet"
            label={asTable ? 'Curve' : 'Table'}
            name={asTable ? `${name} as a curve` : `${name} as a table`}
            onPress={() => setAsTable(!asTable)}
          />
        </>
      }
    >
      {asTable ? (
        <ValuesTable name={name} curves={curves} quantity={quantity} />
      ) : (
        <Comparison label={name} curves={curves} quantity={quantity} />
      )}
      {curves.leftOut.length > 0 && !asTable ? (
        <Txt variant="small" tone="soft">
          The bar at the foot marks the stretch about the jump that the norms leave out.
        </Txt>
      ) : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  card: { gap: space.one },
});
