import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Txt } from '@/components/ui/Txt';
import type { RunStructure } from '@/shared/runs/types';
import { REGIME_WORDS } from '@/shared/structures/structureWords';

interface Props {
  structure: RunStructure;
  store: PlaceAndTimeStore;
  span: number;
}

const FIRST = 6;

/** How the water passes it, change by change; each leads to its moment. */
export function RegimesOf({ structure, store, span }: Props) {
  const { colours } = useTheme();
  const [all, showAll] = useState(false);
  const { id, regimes, chainage } = structure;
  const shown = all ? regimes : regimes.slice(0, FIRST);
  return (
    <View style={styles.list}>
      <Txt strong heading={3}>
        How the water passes
      </Txt>
      <View role="list" aria-label={`How the water passes ${id}`}>
        {shown.map(({ time, regime }) => (
          <View key={time} role="listitem" style={[styles.line, { borderTopColor: colours.line }]}>
            <Txt style={styles.words}>
              {`From ${shortTime(time, span)}: ${REGIME_WORDS[regime]}`}
            </Txt>
            <Button
              kind="quiet"
              label="Show"
              name={`Show ${id} at ${shortTime(time, span)}`}
              onPress={() => store.set({ at: chainage, t: time })}
            />
          </View>
        ))}
      </View>
      {regimes.length > FIRST ? (
        <Button
          kind="quiet"
          label={all ? 'Fewer' : `Show all ${regimes.length} changes`}
          onPress={() => showAll(!all)}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space.half },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    columnGap: space.one,
    borderTopWidth: hairline,
  },
  words: { flex: 1, minWidth: 0 },
});
