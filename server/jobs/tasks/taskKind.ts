/** What a computation may ask and tell while it goes on. */
export interface TaskControl {
  /** Polled often; true: throw `TaskCancelled`, or let the solver throw its own. */
  shouldStop: () => boolean;
  /** 0..1 of this task. */
  onProgress: (fraction: number) => void;
  /** What an attempt that was broken off had kept last; null: nothing. JSON. */
  kept: unknown;
  /** Keeps what is needed to go on from here, should this attempt be broken off; the last counts. */
  keep: (notes: unknown) => void;
}

/** A member as it comes to `gather`; `result` is null where it failed. */
export interface GatheredMember<Payload, Result> {
  index: number;
  label: string;
  payload: Payload;
  result: Result | null;
}

/**
 * How one kind of set is computed, in a worker thread. Both functions are pure, what goes in and out is JSON, and an Error
 * that they throw fails the task with its message.
 */
export interface TaskKind<Input, Payload, Result, Outcome = never> {
  /** One member; `input` is what the whole set shares. */
  compute: (payload: Payload, input: Input, control: TaskControl) => Result | Promise<Result>;
  /** Makes the result of the set when every member has ended and one at least has a result. */
  gather?: (
    members: GatheredMember<Payload, Result>[],
    input: Input,
    control: TaskControl,
  ) => Outcome | Promise<Outcome>;
}

/** A kind whose types only it knows: what its service stores is what it reads. */
export type AnyTaskKind = TaskKind<unknown, unknown, unknown, unknown>;
export const taskKind = <I, P, R, O = never>(kind: TaskKind<I, P, R, O>) => kind as AnyTaskKind;

/** The caller asked the task to stop. */
export class TaskCancelled extends Error {
  constructor() {
    super('The task was cancelled.');
    this.name = 'TaskCancelled';
  }
}
