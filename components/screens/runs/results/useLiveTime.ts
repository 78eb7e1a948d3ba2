import { useMemo } from 'react';
import type { LiveTime } from '@/components/charts/liveTime';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';

/** The time of the store, frame by frame; `start` before one is chosen. */
export const useLiveTime = (store: PlaceAndTimeStore, start: number): LiveTime =>
  useMemo(
    () => ({ time: () => store.get().t ?? start, subscribe: store.subscribe }),
    [store, start],
  );
