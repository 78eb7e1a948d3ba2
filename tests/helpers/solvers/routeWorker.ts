/** Entry of a worker thread: routes the case it is given and posts the result file as JSON. */
import { parentPort, workerData } from 'node:worker_threads';
import { routeCase } from '../../../server/solvers';

parentPort!.postMessage(JSON.stringify(routeCase(workerData)));
