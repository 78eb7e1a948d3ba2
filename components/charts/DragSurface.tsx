import type { ReactNode } from 'react';
import { View, type GestureResponderEvent, type StyleProp, type ViewStyle } from 'react-native';

interface Props {
  /** Place of the finger or pointer across the surface, px from its left edge. */
  onDrag?: (x: number) => void;
  onEnd?: () => void;
  style?: StyleProp<ViewStyle>;
  children?: ReactNode;
}

/**
 * A surface to press and drag along sideways, by finger, pen or mouse. Up and down still scroll the page. It is an aid
 * of the hand only: whoever uses it offers the same by keys on a slider.
 */
export function DragSurface({ onDrag, onEnd, style, children }: Props) {
  const drag = (event: GestureResponderEvent) => onDrag?.(event.nativeEvent.locationX);
  const active = onDrag !== undefined;
  return (
    <View
      style={[active && DRAGGED, style]}
      onStartShouldSetResponder={() => active}
      onMoveShouldSetResponder={() => active}
      onResponderGrant={drag}
      onResponderMove={drag}
      onResponderRelease={onEnd}
      onResponderTerminate={onEnd}
    >
      {children}
    </View>
  );
}

// Known to the browser alone; the types of React Native lag behind its web target.
const DRAGGED = {
  touchAction: 'pan-y',
  userSelect: 'none',
  cursor: 'ew-resize',
} as unknown as ViewStyle;
