import { TASK_KINDS } from '../../jobs/tasks/kinds';
import { taskDispatcher } from '../../jobs/tasks/taskDispatcher';
import { TASK_WORKER } from '../../jobs/tasks/taskPool';
import { taskQueue } from '../../jobs/tasks/taskQueue';
import { QUEUE_TIMING } from '../../jobs/timing';
import { workerSlots } from '../../jobs/workerSlots';
import type { Platform } from '../../platform';
import { buildChangeTaskSets } from './changeTaskSets';
import { buildCreateTaskSet } from './createTaskSet';
import { buildFindTaskSets } from './findTaskSets';

/** Sets of tasks: asking for them, the queue that computes them beside the runs, and what they found. */
export function buildTasks(platform: Platform, busyRuns: () => number) {
  const { env, log, models, sequelize } = platform;
  const timing = QUEUE_TIMING;
  const dispatcher = taskDispatcher({
    queue: taskQueue(sequelize, models, timing),
    log,
    timing,
    slots: workerSlots(env),
    busyRuns,
    gathers: (kind) => TASK_KINDS[kind]?.gather !== undefined,
    workerFile: TASK_WORKER,
  });
  platform.onClose(dispatcher.stop);
  const queued = () => dispatcher.wake();
  return {
    /** Begins to take tasks from the queue. */
    start: dispatcher.start,
    create: buildCreateTaskSet(platform, queued),
    find: buildFindTaskSets(platform),
    change: buildChangeTaskSets(platform, { queued, stop: dispatcher.cancel }),
  };
}
