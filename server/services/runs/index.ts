import { runDispatcher } from '../../jobs/dispatcher';
import { progressHub } from '../../jobs/progressHub';
import { runQueue } from '../../jobs/queue';
import { RUN_WORKER } from '../../jobs/startWorker';
import { QUEUE_TIMING } from '../../jobs/timing';
import { workerSlots } from '../../jobs/workerSlots';
import type { Platform } from '../../platform';
import { buildChangeRuns } from './changeRuns';
import { buildExportRun } from './exportRun';
import { buildFindRuns } from './findRuns';
import { buildReadResults } from './readResults';
import { buildRequestRun } from './requestRun';
import { buildWatchRun } from './watchRun';

/** Everything about runs: asking for them, the queue that computes them, and their results. */
export function buildRuns(platform: Platform) {
  const { env, log, models, sequelize } = platform;
  const timing = QUEUE_TIMING;
  const hub = progressHub();
  const queue = runQueue(sequelize, models, timing);
  const slots = workerSlots(env);
  const workerFile = RUN_WORKER;
  const dispatcher = runDispatcher({ queue, models, hub, log, timing, slots, workerFile });
  platform.onClose(dispatcher.stop);

  const queued = () => dispatcher.wake();
  const results = buildReadResults(models);
  return {
    /** Begins to take runs from the queue. */
    start: dispatcher.start,
    busy: dispatcher.busy,
    ...buildRequestRun(platform, queued),
    find: buildFindRuns(platform),
    change: buildChangeRuns(platform, { hub, queued, stop: dispatcher.cancel }),
    watch: buildWatchRun(models, hub, log),
    watchers: hub.watchers,
    results,
    exports: buildExportRun(platform, results),
  };
}
