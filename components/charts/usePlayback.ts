import { useEffect, useState } from 'react';
import { useIsFocused } from 'expo-router';
import type { PlaceAndTimeStore } from './placeAndTime';

export interface Playback {
  isPlaying: boolean;
  play: () => void;
  pause: () => void;
}

/** Runs the time of the store from where it stands to `end`, the whole span in `seconds`; from the start when at the end. */
export function usePlayback(
  store: PlaceAndTimeStore,
  span: { start: number; end: number },
  seconds: number,
): Playback {
  const { start, end } = span;
  const [isPlaying, setPlaying] = useState(false);
  const isFocused = useIsFocused();
  const rate = (end - start) / (seconds * 1000);

  useEffect(() => {
    if (!isPlaying || !isFocused) return undefined;
    let frame = 0;
    let before: number | null = null;
    const step = (now: number) => {
      const passed = before === null ? 0 : now - before;
      before = now;
      const t = Math.min(end, (store.get().t ?? start) + passed * rate);
      store.playT(t, now);
      if (t >= end) setPlaying(false);
      else frame = requestAnimationFrame(step);
    };
    frame = requestAnimationFrame(step);
    return () => {
      cancelAnimationFrame(frame);
      store.settle();
    };
  }, [isPlaying, isFocused, store, start, end, rate]);

  const play = () => {
    if ((store.get().t ?? start) >= end) store.setT(start);
    setPlaying(true);
  };
  return { isPlaying, play, pause: () => setPlaying(false) };
}
