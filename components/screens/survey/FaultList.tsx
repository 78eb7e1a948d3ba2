import { StyleSheet, View } from 'react-native';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Txt } from '@/components/ui/Txt';
import type { SurveyFault } from '@/shared/surveys/types';
import { faultCell, faultPlace } from './faultPlace';

interface FaultListProps {
  /** What the list holds, for screen readers. */
  label: string;
  faults: readonly SurveyFault[];
  notListed?: number;
}

/** A fault a line: where it stands in the file, what is wrong, and what would be right. */
export function FaultList({ label, faults, notListed = 0 }: FaultListProps) {
  const { colours } = useTheme();
  const line = { borderTopColor: colours.line };
  return (
    <View role="list" aria-label={label}>
      {faults.map((fault, index) => (
        <View key={index} role="listitem" style={[styles.row, line]}>
          <View style={styles.place} aria-label={faultPlace(fault)}>
            <Txt variant="small" strong tone={fault.severity === 'fault' ? 'brick' : 'ochre'}>
              {fault.sheet ? `Sheet ${fault.sheet}` : 'The file'}
            </Txt>
            <Txt variant="small" strong tone={fault.severity === 'fault' ? 'brick' : 'ochre'}>
              {faultCell(fault)}
            </Txt>
            {fault.severity === 'doubt' ? (
              <Txt variant="small" tone="ochre">
                a doubt
              </Txt>
            ) : null}
          </View>
          <View style={styles.words}>
            <Txt strong>{fault.title}</Txt>
            <Txt tone="soft">{fault.detail}</Txt>
          </View>
        </View>
      ))}
      {notListed > 0 ? (
        <View role="listitem" style={[styles.row, line]}>
          <Txt tone="soft">
            And {notListed.toLocaleString('en-GB')} more that are not listed. They are often of the
            same kind: mend these first and send the file again.
          </Txt>
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    gap: space.two,
    paddingVertical: space.one * 1.5,
    borderTopWidth: hairline,
  },
  place: { width: 104, flexShrink: 0 },
  words: { flex: 1, minWidth: 0 },
});
