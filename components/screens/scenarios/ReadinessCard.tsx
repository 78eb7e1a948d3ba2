import { StyleSheet, View } from 'react-native';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import type { Fault } from '@/shared/errors';
import { useEditing } from './editorContext';
import { messageAt, PART_TITLES, partOf, placeOf } from './faultPlaces';
import { jumpTo } from './jumpTo';

/** What stands in the way of routing, each a jump to its place; then what is doubtful. */
export function ReadinessCard() {
  const { editor, reach } = useEditing();
  const { faults, doubts } = editor;
  const places = [...new Set(faults.map(({ path }) => placeOf(path)))];
  return (
    <Card
      title={places.length > 0 ? 'Before it can be routed' : 'Ready to route'}
      aside={places.length > 0 ? `${places.length} to mend` : undefined}
    >
      {!reach ? (
        <Txt tone="soft">It is checked as soon as the reach is read.</Txt>
      ) : places.length === 0 ? (
        <Txt tone="soft">Nothing is missing.</Txt>
      ) : (
        <Places label="To mend" paths={places} faults={faults} tone="brick" />
      )}
      {doubts.length > 0 ? (
        <>
          <Txt strong heading={3}>
            Worth a second look
          </Txt>
          <Places
            label="Worth a second look"
            paths={[...new Set(doubts.map(({ path }) => placeOf(path)))]}
            faults={doubts}
            tone="ochre"
          />
        </>
      ) : null}
    </Card>
  );
}

interface PlacesProps {
  label: string;
  paths: readonly string[];
  faults: readonly Fault[];
  tone: 'brick' | 'ochre';
}

function Places({ label, paths, faults, tone }: PlacesProps) {
  const { colours } = useTheme();
  return (
    <View role="list" aria-label={label}>
      {paths.map((path) => (
        <View key={path} role="listitem" style={[styles.place, { borderTopColor: colours.line }]}>
          <View style={styles.words}>
            <Txt variant="small" strong tone={tone}>
              {PART_TITLES[partOf(path)]}
            </Txt>
            <Txt>{messageAt(faults, path)}</Txt>
          </View>
          <Button
            kind="quiet"
            label="Go there"
            name={`Go there: ${messageAt(faults, path)}`}
            onPress={() => jumpTo(path)}
          />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  place: {
    flexDirection: 'row',
    alignItems: 'center',
    paddingVertical: space.half,
    borderTopWidth: hairline,
  },
  words: { flex: 1, minWidth: 0 },
});
