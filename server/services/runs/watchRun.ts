import type { Logger } from 'pino';
import type { RunEvent } from '../../../shared/runs/types';
import type { ProgressHub } from '../../jobs/progressHub';
import type { Models } from '../../models';
import type { RunModel } from '../../models/Run';

export interface Watcher {
  send: (event: RunEvent) => void;
  /** Looked at from time to time: a sign-in that ended, or a right that was taken away, ends the watching. */
  stillAllowed: () => Promise<boolean>;
  /** No more events come. */
  close: () => void;
}

const LOOK_MILLISECONDS = 2000;

/**
 * Tells how a run goes: its state at once, then what the worker of this process tells, or what the database says where
 * another process computes it, and at last that it ended. Answers the way to stop.
 */
export function buildWatchRun({ Run }: Models, hub: ProgressHub, log: Logger) {
  return (runId: number, watcher: Watcher): (() => void) => {
    let over = false;
    let begun = false;
    let timer: NodeJS.Timeout | undefined;

    const stop = () => {
      over = true;
      clearTimeout(timer);
      unsubscribe();
    };
    const tell = (event: RunEvent) => {
      if (over) return;
      watcher.send(event);
      if (event.type !== 'ended') return;
      stop();
      watcher.close();
    };
    const unsubscribe = hub.subscribe(runId, (event) => {
      if (begun || event.type === 'ended') tell(event);
    });

    async function look(): Promise<void> {
      if (begun && !(await watcher.stillAllowed())) {
        stop();
        return watcher.close();
      }
      const run = await Run.findByPk(runId);
      if (over) return;
      if (!run) {
        stop();
        return watcher.close();
      }
      const here = hub.latest(runId);
      if (!begun || !here || isEnded(run)) tell(isEnded(run) ? ended(run) : (here ?? stored(run)));
      begun = true;
    }
    const lookAgain = () => {
      look()
        .catch((error: unknown) => log.warn({ err: error, runId }, 'a watched run was not read'))
        .finally(() => {
          if (!over) timer = setTimeout(lookAgain, LOOK_MILLISECONDS);
        });
    };
    lookAgain();
    return stop;
  };
}

const isEnded = ({ state }: RunModel) => state !== 'queued' && state !== 'running';
const ended = ({ state }: RunModel): RunEvent => ({ type: 'ended', state });
const stored = ({ state, progress, secondsLeft, duration }: RunModel): RunEvent => ({
  type: 'progress',
  state,
  progress,
  secondsLeft,
  time: progress * duration,
  surface: null,
});
