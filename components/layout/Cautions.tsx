import { StyleSheet, View } from 'react-native';
import { CAUTIONS } from '@/shared/runs/cautions';
import { space, widths } from '../theme/tokens';
import { Txt } from '../ui/Txt';

/** Stands wherever a result can be read. */
export function Cautions() {
  return (
    <View role="note" aria-label="Cautions" style={styles.box}>
      {CAUTIONS.map((caution) => (
        <Txt key={caution} variant="small" tone="soft">
          {caution}
        </Txt>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.half, maxWidth: widths.prose } });
