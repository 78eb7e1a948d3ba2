import { Link } from 'expo-router';
import { Pressable, ScrollView, StyleSheet, View } from 'react-native';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import { useMe } from '../queries/SessionProvider';
import { hairline, space, widths } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Txt } from '../ui/Txt';
import { PlaceLink } from './PlaceLink';
import { isAt, type Place } from './places';
import { usePlaces } from './usePlaces';
import { Wordmark } from './Wordmark';

/** The places of a study, and who is signed in; wide windows only. */
export function Rail() {
  const { colours } = useTheme();
  const { house, study, pathname } = usePlaces();
  const me = useMe();
  const list = (places: Place[]) =>
    places.map((place) => (
      <PlaceLink key={place.path} place={place} here={isAt(place, pathname)} />
    ));
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[styles.rail, { borderRightColor: colours.line }]}
    >
      <Link href="/" asChild>
        <Pressable role="link" aria-label="Spate, to the first page" style={styles.mark}>
          <Wordmark />
        </Pressable>
      </Link>
      <ScrollView contentContainerStyle={styles.places}>
        {study.length > 0 ? (
          <View style={[styles.group, styles.divided, { borderBottomColor: colours.line }]}>
            {list(study)}
          </View>
        ) : null}
        <View style={styles.group}>{list(house)}</View>
      </ScrollView>
      <View style={styles.person}>
        <Txt variant="small" strong>
          {me.name}
        </Txt>
        <Txt variant="small" tone="soft">
          {`${me.roles.map((role) => ROLE_NAMES[role]).join(', ')}, ${me.firm.name}`}
        </Txt>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  rail: {
    width: widths.rail,
    borderRightWidth: hairline,
    paddingHorizontal: 13,
    paddingVertical: space.three,
  },
  mark: { paddingHorizontal: space.one + 2, paddingBottom: space.three, alignSelf: 'flex-start' },
  places: { gap: space.two },
  group: { gap: 2 },
  divided: { borderBottomWidth: hairline, paddingBottom: space.two },
  person: { paddingHorizontal: space.one + 2, paddingTop: space.two },
});
