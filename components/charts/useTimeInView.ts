import { useCallback, useState, useSyncExternalStore } from 'react';
import type { View } from 'react-native';
import type { PlaceAndTimeStore } from './placeAndTime';

const NEVER = () => () => undefined;

/** The time as `useTime` has it, for what draws much: it stands while nobody can see it. Give `watch` to the view as its ref. */
export function useTimeInView(store: PlaceAndTimeStore): {
  watch: (view: View | null) => (() => void) | undefined;
  t: number | null;
} {
  const [isInView, setInView] = useState(true);
  const watch = useCallback((view: View | null) => {
    if (!view || typeof IntersectionObserver === 'undefined') return undefined;
    const observer = new IntersectionObserver(([{ isIntersecting }]) => setInView(isIntersecting));
    observer.observe(view as unknown as Element);
    return () => observer.disconnect();
  }, []);
  const t = useSyncExternalStore(isInView ? store.subscribeShown : NEVER, () => store.shown().t);
  return { watch, t };
}
