import { EventEmitter } from 'node:events';
import type { RunEvent } from '../../shared/runs/types';

/** Events of the runs that this process computes, from the dispatcher to whoever watches. Nothing is stored. */
export interface ProgressHub {
  publish(runId: number, event: RunEvent): void;
  /** The last event of a run that goes on here. */
  latest(runId: number): RunEvent | null;
  /** The run does not go on here any more, and how it goes is not known here. */
  forget(runId: number): void;
  /** Answers the way to stop listening. */
  subscribe(runId: number, listener: (event: RunEvent) => void): () => void;
  /** How many listen. */
  watchers(): number;
}

export function progressHub(): ProgressHub {
  const emitter = new EventEmitter();
  emitter.setMaxListeners(0);
  const last = new Map<number, RunEvent>();
  return {
    publish(runId, event) {
      if (event.type === 'ended') last.delete(runId);
      else last.set(runId, withSurface(event, last.get(runId)));
      emitter.emit(String(runId), event);
    },
    forget: (runId) => void last.delete(runId),
    latest: (runId) => last.get(runId) ?? null,
    subscribe(runId, listener) {
      emitter.on(String(runId), listener);
      return () => void emitter.off(String(runId), listener);
    },
    watchers: () =>
      emitter.eventNames().reduce((sum, name) => sum + emitter.listenerCount(name), 0),
  };
}

/** Who comes late sees the last picture, not only the last percentage. */
function withSurface(event: RunEvent, before: RunEvent | undefined): RunEvent {
  if (event.type !== 'progress' || event.surface || before?.type !== 'progress') return event;
  return before.surface ? { ...event, time: before.time, surface: before.surface } : event;
}
