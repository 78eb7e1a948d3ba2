import { taskKind } from '../../../server/jobs/tasks/taskKind';
import { runTaskOf } from '../../../server/jobs/tasks/runTask';
import { TaskCancelled, type TaskControl } from '../../../server/jobs/tasks/taskKind';

/** What a stand-in for a member does. */
export interface FakeMember {
  does: 'adds' | 'fails' | 'exits' | 'isStuck' | 'counts';
  /** ms of wall time before it does so; of one that counts, between its numbers. */
  after: number;
  value: number;
}

function wait({ after, does }: FakeMember, { shouldStop, onProgress }: TaskControl): void {
  const began = Date.now();
  while (Date.now() - began < after) {
    if (does === 'isStuck') continue;
    if (shouldStop()) throw new TaskCancelled();
    onProgress((Date.now() - began) / after);
    Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5);
  }
}

/** Counts to the value from where an attempt before it was broken off; answers how many it has counted itself. */
function count(member: FakeMember, control: TaskControl): number {
  const from = (control.kept as number | null) ?? 0;
  for (let k = from; k < member.value; k++) {
    wait(member, control);
    control.keep(k + 1);
  }
  return member.value - from;
}

const fake = taskKind<{ offset: number }, FakeMember, number, { sum: number; failed: number }>({
  compute(member, { offset }, control) {
    if (member.does === 'counts') return count(member, control);
    wait(member, control);
    if (member.does === 'fails') throw new Error('The wall of the channel is missing.');
    if (member.does === 'exits') process.exit(7);
    return member.value + offset;
  },
  gather: (members) => ({
    sum: members.reduce((sum, { result }) => sum + (result ?? 0), 0),
    failed: members.filter(({ result }) => result === null).length,
  }),
});

/** Entry of worker threads that compute stand-ins. */
export default runTaskOf({ ensemble: fake, sensitivity: fake });
