import { StyleSheet, View } from 'react-native';
import { hairline, radius } from '@/components/theme/tokens';
import type { Colours } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Txt } from '@/components/ui/Txt';
import type { HazardClass } from '@/shared/hazard/hazardClass';
import type { RunAlong } from '@/shared/runs/types';
import { hazardStretches } from './hazardStretches';

interface Props {
  places: RunAlong['sections'];
  /** Chosen chainage, m. */
  at: number | null;
  onChange: (at: number) => void;
}

/** Ground of a class; its letter stands on it, so that the colour says nothing alone. */
const GROUND: Record<HazardClass['label'], keyof Colours> = {
  H1: 'mossTint',
  H2: 'mossTint',
  H3: 'ochreTint',
  H4: 'ochreTint',
  H5: 'brickTint',
  H6: 'brickTint',
};

/** The reach as a band from upstream to downstream, each stretch with its class. The table says the same in words. */
export function HazardBand({ places, at, onChange }: Props) {
  const { colours } = useTheme();
  const stretches = hazardStretches(places);
  if (stretches.length === 0) return null;
  const first = places[0].chainage;
  const length = places[places.length - 1].chainage - first;
  const share = at === null || length <= 0 ? null : (at - first) / length;
  return (
    <View style={[styles.band, { borderColor: colours.edge }]} aria-hidden>
      {stretches.map(({ from, to, hazard }) => (
        <View
          key={from}
          onPointerDown={() => onChange((from + to) / 2)}
          style={[
            styles.stretch,
            {
              flexGrow: Math.max(to - from, 1e-6),
              backgroundColor: colours[hazard ? GROUND[hazard] : 'card'],
              borderRightColor: colours.card,
            },
          ]}
        >
          {(to - from) / length > 0.04 ? (
            <Txt variant="caption" strong>
              {hazard ?? 'dry'}
            </Txt>
          ) : null}
        </View>
      ))}
      {share !== null && share >= 0 && share <= 1
        ? // From both edges, so that it never crosses out a class.
          (['top', 'bottom'] as const).map((edge) => (
            <View
              key={edge}
              style={[
                styles.cursor,
                { [edge]: 0, left: `${100 * share}%`, backgroundColor: colours.ink },
              ]}
            />
          ))
        : null}
    </View>
  );
}

const styles = StyleSheet.create({
  band: {
    flexDirection: 'row',
    height: 28,
    borderWidth: hairline,
    borderRadius: radius.small,
    overflow: 'hidden',
  },
  stretch: {
    flexBasis: 0,
    minWidth: 0,
    alignItems: 'center',
    justifyContent: 'center',
    borderRightWidth: hairline,
    overflow: 'hidden',
  },
  cursor: { position: 'absolute', height: 7, width: 3, marginLeft: -1.5 },
});
