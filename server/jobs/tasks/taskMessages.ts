import type { MessagePort } from 'node:worker_threads';
import type { TaskSetKind } from '../../../shared/tasks/types';
import type { Said } from '../../../shared/units/message';

/** What a worker thread is given: gzip of JSON throughout. */
export interface TaskWork {
  setId: number;
  kind: TaskSetKind;
  input: Uint8Array;
  what:
    | { part: 'member'; payload: Uint8Array; notes: Uint8Array | null }
    | {
        part: 'gather';
        members: {
          index: number;
          label: string;
          payload: Uint8Array;
          result: Uint8Array | null;
        }[];
      };
  /** Int32 at 0: not zero means stop. Float64 at 8: how far it is, 0..1. */
  shared: SharedArrayBuffer;
  /** Where it sends its notes, each a Uint8Array. One that is lost costs no more than computing again. */
  notebook: MessagePort;
}

/** What the queue knows of it. */
export type StoredWork = Omit<TaskWork, 'shared' | 'notebook'>;

export type TaskAnswer =
  | { type: 'finished'; result: Uint8Array }
  | { type: 'failed'; reason: Said; fault?: string }
  | { type: 'cancelled' };
