import { useLayoutEffect } from 'react';
import type { LiveTime } from './liveTime';

/**
 * Runs `draw` with the time of each frame and whenever `draw` itself is another: keep it the same function while only time
 * moves. It writes into the page through refs; what it writes React must never write.
 */
export function useEachFrame(live: LiveTime, draw: (t: number) => void): void {
  useLayoutEffect(() => {
    const now = () => draw(live.time());
    now();
    return live.subscribe(now);
  }, [live, draw]);
}
