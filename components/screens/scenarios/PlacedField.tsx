import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Txt } from '@/components/ui/Txt';
import { useEditing } from './editorContext';
import { anchorOf } from './faultPlaces';

interface PlacedFieldProps {
  /** Path of what it holds in the body, e.g. `upstream.peakFlow`. */
  path: string;
  /** Half a row on wide. */
  half?: boolean;
  children: (fault: string | undefined) => ReactNode;
}

/** A field at its place: the list of faults jumps here, and a doubt is said below it. */
export function PlacedField({ path, half, children }: PlacedFieldProps) {
  const { faultAt, doubtAt } = useEditing();
  const doubt = doubtAt(path);
  return (
    <View nativeID={anchorOf(path)} style={half ? styles.half : styles.whole}>
      {children(faultAt(path))}
      {doubt ? (
        <Txt variant="small" tone="ochre">
          {doubt}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  whole: { gap: space.half, alignSelf: 'stretch', minWidth: 0 },
  half: { gap: space.half, flexGrow: 1, flexBasis: 200, minWidth: 0 },
});
