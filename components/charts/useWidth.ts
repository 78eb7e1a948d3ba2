import { useCallback, useState } from 'react';
import type { LayoutChangeEvent, View } from 'react-native';

/**
 * Width of a view, px: measured before it is first painted, so that a drawing never stands empty, and again whenever it
 * changes. Spread `measured` onto the view.
 */
export function useWidth(initial = 0) {
  const [width, setWidth] = useState(initial);
  const ref = useCallback((view: View | null) => {
    const box = (view as unknown as HTMLElement | null)?.getBoundingClientRect();
    // Where there is no layout, as in a test, the given width stands.
    if (box && box.width > 0) setWidth(box.width);
  }, []);
  const onLayout = useCallback(
    (event: LayoutChangeEvent) => setWidth(event.nativeEvent.layout.width),
    [],
  );
  return { width, measured: { ref, onLayout } };
}
