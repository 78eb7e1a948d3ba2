import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import { hairline, radius, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { aria } from '../ui/aria';
import { Txt } from '../ui/Txt';
import type { Place } from './places';

/** One line of the rail, or of the list behind "More". */
export function PlaceLink({
  place,
  here,
  onPress,
}: {
  place: Place;
  here: boolean;
  onPress?: () => void;
}) {
  const { colours } = useTheme();
  const look = here
    ? { backgroundColor: colours.card, borderColor: colours.line }
    : { borderColor: 'transparent' };
  return (
    <Link href={place.href} asChild>
      <Pressable
        role="link"
        onPress={onPress}
        {...aria({ 'aria-current': here ? 'page' : undefined })}
        style={{ ...styles.place, ...look }}
      >
        <Txt strong={here} tone={here ? 'ink' : 'soft'}>
          {place.label}
        </Txt>
        {place.aside ? (
          <View style={styles.aside}>
            <Txt variant="small" strong={here} tone={here ? 'ink' : 'soft'}>
              {place.aside}
            </Txt>
          </View>
        ) : null}
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  place: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'center',
    minHeight: touch,
    paddingHorizontal: space.one + 2,
    borderWidth: hairline,
    borderRadius: radius.control,
  },
  aside: { marginLeft: space.one },
});
