import { useEffect, useRef, useSyncExternalStore } from 'react';
import { router, useIsFocused, useLocalSearchParams } from 'expo-router';
import {
  placeAndTimeOf,
  readPlaceAndTime,
  writePlaceAndTime,
  type PlaceAndTime,
  type PlaceAndTimeStore,
} from './placeAndTime';

/** Quiet time before the address follows: browsers limit how often it may change, and play moves it every frame. */
const SETTLE_MS = 300;

/**
 * Place and time of the study on screen, kept in its address as `at` and `t`. The address wins when it brings them;
 * otherwise the screen takes over what the one before it showed. Does not render again when they change:
 * `usePlace` and `useTime` do.
 */
export function usePlaceAndTimeStore(): PlaceAndTimeStore {
  const params = useLocalSearchParams<{ studyId: string; at?: string; t?: string }>();
  const focused = useIsFocused();
  const store = placeAndTimeOf(params.studyId ?? '');
  const written = useRef<string | null>(null);

  // Before the first drawing, so that a link opens at its moment; later when back and forward change the address.
  const shown = `${params.at ?? ''}|${params.t ?? ''}`;
  useEffect(() => {
    if (!focused || shown === written.current) return;
    written.current = shown;
    const [at, t] = shown.split('|');
    store.set(readPlaceAndTime({ at, t }));
  }, [focused, shown, store]);

  useEffect(() => {
    if (!focused) return undefined;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const write = () => {
      const next = writePlaceAndTime(store.shown());
      const text = `${next.at ?? ''}|${next.t ?? ''}`;
      if (text === written.current) return;
      written.current = text;
      router.setParams(next);
    };
    const later = () => {
      clearTimeout(timer);
      timer = setTimeout(write, SETTLE_MS);
    };
    const stop = store.subscribeShown(later);
    later();
    return () => {
      stop();
      clearTimeout(timer);
    };
  }, [focused, store]);
  return store;
}

export const usePlace = (store: PlaceAndTimeStore): number | null =>
  useSyncExternalStore(store.subscribeShown, () => store.shown().at);

export const useTime = (store: PlaceAndTimeStore): number | null =>
  useSyncExternalStore(store.subscribeShown, () => store.shown().t);

/** Place and time with their setters, for screens where nothing plays. */
export function usePlaceAndTime(): PlaceAndTime & Pick<PlaceAndTimeStore, 'setAt' | 'setT'> {
  const store = usePlaceAndTimeStore();
  return { at: usePlace(store), t: useTime(store), setAt: store.setAt, setT: store.setT };
}
