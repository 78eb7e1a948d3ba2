import { gunzipSync, gzipSync } from 'node:zlib';
import type { TaskSetKind } from '../../../shared/tasks/types';
import { SaidError } from '../../../shared/units/SaidError';
import { RunCancelled } from '../../solvers';
import { TaskCancelled, type AnyTaskKind, type TaskControl } from './taskKind';
import type { TaskAnswer, TaskWork } from './taskMessages';

/** The function that a worker thread computes tasks with, from the kinds that it knows. */
export function runTaskOf(kinds: Partial<Record<TaskSetKind, AnyTaskKind>>) {
  /** Members of a set follow each other: its input is unpacked once. */
  let lastInput: { setId: number; value: unknown } | null = null;

  return async (work: TaskWork): Promise<TaskAnswer> => {
    const { setId, kind, input, what, shared, notebook } = work;
    const stop = new Int32Array(shared, 0, 1);
    const progress = new Float64Array(shared, 8, 1);
    const control: TaskControl = {
      shouldStop: () => Atomics.load(stop, 0) !== 0,
      onProgress: (fraction) => void (progress[0] = fraction),
      kept: what.part === 'member' && what.notes ? unpack(what.notes) : null,
      keep: (notes) => notebook.postMessage(gzipSync(JSON.stringify(notes))),
    };
    try {
      if (lastInput?.setId !== setId) lastInput = { setId, value: unpack(input) };
      const computed = await compute(kinds[kind], what, lastInput.value, control);
      return { type: 'finished', result: gzipSync(JSON.stringify(computed)) };
    } catch (error) {
      if (error instanceof RunCancelled || error instanceof TaskCancelled)
        return { type: 'cancelled' };
      if (error instanceof SaidError) return { type: 'failed', reason: error.said };
      const { message, stack } = error as Error;
      return { type: 'failed', reason: { message }, fault: stack ?? message };
    }
  };
}

function compute(
  kind: AnyTaskKind | undefined,
  what: TaskWork['what'],
  input: unknown,
  control: TaskControl,
): unknown {
  if (!kind) throw new Error('This version of the server does not know how to compute it.');
  if (what.part === 'member') return kind.compute(unpack(what.payload), input, control);
  const members = what.members.map(({ payload, result, ...named }) => ({
    ...named,
    payload: unpack(payload),
    result: result && unpack(result),
  }));
  return kind.gather!(members, input, control);
}

const unpack = (bytes: Uint8Array): unknown => JSON.parse(gunzipSync(bytes).toString('utf8'));
