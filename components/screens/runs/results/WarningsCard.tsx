import { StyleSheet, View } from 'react-native';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunSummary } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { sayIn } from '@/shared/units/message';

type Warning = RunSummary['warnings'][number];

interface Props {
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** What the computation itself asks to be looked at; each leads to its place and time. */
export function WarningsCard({ summary, store }: Props) {
  const { warnings } = summary;
  return (
    <Card title="Warnings" aside={warnings.length ? String(warnings.length) : undefined}>
      {warnings.length ? (
        <View role="list">
          {warnings.map((warning, i) => (
            <Line key={i} warning={warning} summary={summary} store={store} />
          ))}
        </View>
      ) : (
        <Txt>Nothing in the computation asks for a second look.</Txt>
      )}
    </Card>
  );
}

function Line({ warning, summary, store }: Props & { warning: Warning }) {
  const { colours } = useTheme();
  const unitSystem = useUnitSystem();
  const { chainage, time } = warning;
  const span = summary.times.end - summary.times.start;
  const where = [
    chainage === null ? null : formatWithUnit(chainage, 'chainage', unitSystem),
    time === null ? null : shortTime(time, span),
  ].filter((part) => part !== null);
  const show = () =>
    store.set({
      ...(chainage === null ? {} : { at: chainage }),
      ...(time === null ? {} : { t: time }),
    });
  return (
    <View role="listitem" style={[styles.line, { borderTopColor: colours.line }]}>
      <Txt>{sayIn(unitSystem, warning)}</Txt>
      {where.length ? (
        <Button kind="quiet" label={`Show ${where.join(', ')}`} onPress={show} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { borderTopWidth: hairline, paddingTop: space.one, gap: space.half },
});
