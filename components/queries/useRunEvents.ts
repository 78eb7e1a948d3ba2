import { useEffect, useState } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import type { RunEvent } from '@/shared/runs/types';
import { isApiError } from './ApiError';
import { api } from './apiClient';
import { runEnded } from './runs';

export type RunProgress = Extract<RunEvent, { type: 'progress' }>;

export interface RunEvents {
  /** The latest; null before the first. */
  progress: RunProgress | null;
  /** Highest water of those seen since the screen was opened, at the places of the surface, m. */
  highest: number[] | null;
  /** The line to the server is broken and being mended. */
  isLost: boolean;
}

const FIRST_WAIT_MS = 1000;
const LONGEST_WAIT_MS = 15_000;

/** Follows a run while it is queued or running; a broken line is taken up again, each time a little later. */
export function useRunEvents(studyId: number, runId: number): RunEvents {
  const client = useQueryClient();
  const [events, setEvents] = useState<RunEvents>(NONE);

  useEffect(() => {
    const stop = new AbortController();
    let wait = FIRST_WAIT_MS;
    let surface: RunProgress['surface'] = null;
    let highest: number[] | null = null;

    const take = (event: RunEvent) => {
      if (event.type === 'ended') return;
      // Not every event brings the water; between two that do, the last one stands.
      surface = event.surface ?? surface;
      highest = event.surface ? higher(highest, event.surface.stage) : highest;
      setEvents({ progress: { ...event, surface }, highest, isLost: false });
    };
    const follow = async () => {
      for await (const { data } of api.stream(`/runs/${runId}/events`, { signal: stop.signal })) {
        wait = FIRST_WAIT_MS;
        const event = JSON.parse(data) as RunEvent;
        take(event);
        if (event.type === 'ended') return true;
      }
      return false;
    };
    const keepFollowing = async () => {
      while (!stop.signal.aborted) {
        try {
          if (await follow()) break;
        } catch (error) {
          if (stop.signal.aborted) return;
          // Not ours to see any more: the screen finds out by reading the run again.
          if (isApiError(error, 'notFound', 'unauthenticated', 'forbidden')) break;
        }
        setEvents((before) => ({ ...before, isLost: true }));
        await pause(wait, stop.signal);
        wait = Math.min(LONGEST_WAIT_MS, wait * 2);
      }
      if (!stop.signal.aborted) await runEnded(client, studyId, runId);
    };
    void keepFollowing();
    return () => stop.abort();
  }, [client, studyId, runId]);

  return events;
}

const NONE: RunEvents = { progress: null, highest: null, isLost: false };

const higher = (before: number[] | null, stage: number[]) =>
  before?.length === stage.length ? stage.map((level, i) => Math.max(level, before[i])) : stage;

const pause = (ms: number, signal: AbortSignal) =>
  new Promise<void>((resolve) => {
    const timer = setTimeout(resolve, ms);
    signal.addEventListener('abort', () => {
      clearTimeout(timer);
      resolve();
    });
  });
