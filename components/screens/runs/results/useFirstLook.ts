import { useEffect } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { RunSummary } from '@/shared/runs/types';
import { firstLook, isOnReach } from './placeOf';

/** Where the address says nothing, or speaks of another reach or a longer run. */
export function useFirstLook(store: PlaceAndTimeStore, summary: RunSummary) {
  useEffect(() => {
    const { at, t } = store.get();
    const first = firstLook(summary);
    if (!isOnReach(summary, at)) store.set({ at: first.at });
    if (t === null || t < summary.times.start || t > summary.times.end) store.set({ t: first.t });
  }, [store, summary]);
}
