import { addIndex, type Step } from '../database/columns';

/** The queue asks for sets that go on, least recently served first; the checklist for those of a case. */
export const up: Step = async ({ context }) => {
  await addIndex(context, 'task_sets', ['state', 'served_at']);
  await addIndex(context, 'task_sets', ['case_hash']);
};

/** They go with the table. */
export const down: Step = async () => {};
