import type { Step } from '../database/columns';

const INDEXES = [
  { name: 'runs_number', fields: ['study_id', 'number'], unique: true },
  // The queue takes the oldest of a state, recovery those whose lease ran out.
  { name: 'runs_state', fields: ['state', 'id'], unique: false },
  { name: 'runs_lease', fields: ['state', 'lease_until'], unique: false },
];

export const up: Step = async ({ context }) => {
  const there = (await context.showIndex('runs')) as { name: string }[];
  for (const { name, fields, unique } of INDEXES) {
    if (!there.some((index) => index.name === name)) {
      await context.addIndex('runs', fields, { name, unique });
    }
  }
};

/** They go with the table: the foreign key of the study needs one of them as long as it stands. */
export const down: Step = async () => {};
