import { Link } from 'expo-router';
import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { hairline, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { aria } from '../ui/aria';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Txt } from '../ui/Txt';
import { PlaceLink } from './PlaceLink';
import { isAt, splitForPhone } from './places';
import { usePlaces } from './usePlaces';

/** Up to five places within thumb reach; the rest of the house stands behind "More". */
export function PhoneNav() {
  const { colours } = useTheme();
  const { house, study, pathname } = usePlaces();
  const [open, setOpen] = useState(false);
  const all = study.length > 0 ? [...study, ...house] : house;
  const { shown, more } = splitForPhone(all);
  const isInMore = more.some((place) => isAt(place, pathname));
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[styles.row, { backgroundColor: colours.card, borderTopColor: colours.line }]}
    >
      {shown.map((place) => {
        const here = isAt(place, pathname);
        return (
          <Link key={place.path} href={place.href} asChild>
            <Pressable
              role="link"
              {...aria({ 'aria-current': here ? 'page' : undefined })}
              style={styles.place}
            >
              <Txt variant="small" strong={here} tone={here ? 'water' : 'soft'}>
                {place.label}
              </Txt>
            </Pressable>
          </Link>
        );
      })}
      {more.length > 0 ? (
        <Pressable
          role="button"
          aria-expanded={open}
          onPress={() => setOpen(true)}
          {...aria({ 'aria-haspopup': 'dialog' })}
          style={styles.place}
        >
          <Txt variant="small" strong={isInMore} tone={isInMore ? 'water' : 'soft'}>
            More
          </Txt>
        </Pressable>
      ) : null}
      <Dialog
        title="More"
        open={open}
        onClose={() => setOpen(false)}
        actions={<Button label="Close" onPress={() => setOpen(false)} />}
      >
        <View>
          {more.map((place) => (
            <PlaceLink
              key={place.path}
              place={place}
              here={isAt(place, pathname)}
              onPress={() => setOpen(false)}
            />
          ))}
        </View>
      </Dialog>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', borderTopWidth: hairline, paddingBottom: space.one },
  place: { flex: 1, minHeight: touch + 4, alignItems: 'center', justifyContent: 'center' },
});
