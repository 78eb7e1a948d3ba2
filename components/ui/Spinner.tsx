import { ActivityIndicator, View } from 'react-native';

/** Turns while something is waited for. Words beside it say what for: readers are told those alone. */
export function Spinner({ colour, size }: { colour: string; size?: 'small' | 'large' }) {
  return (
    <View aria-hidden>
      <ActivityIndicator color={colour} size={size} />
    </View>
  );
}
