import { TASK_KINDS } from './kinds';
import { runTaskOf } from './runTask';

/** Entry of the worker threads that compute tasks; a thread stays for the next one. */
export default runTaskOf(TASK_KINDS);
