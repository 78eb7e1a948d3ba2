import type { Step } from '../database/columns';
import { allowAgain, refuse, type Refusal } from '../database/triggers';

/** A report is kept to the byte, and only of what was signed or withdrawn. */
const REFUSALS: Refusal[] = [
  {
    table: 'reports',
    on: ['UPDATE', 'DELETE'],
    when: 'TRUE',
    message: 'Reports are kept as they were made.',
  },
  {
    table: 'reports',
    on: ['INSERT'],
    when: `NEW.standing NOT IN ('signed', 'withdrawn')
      OR NOT EXISTS (SELECT 1 FROM sign_offs WHERE run_id = NEW.run_id)
      OR (NEW.standing = 'withdrawn') <> EXISTS (SELECT 1 FROM withdrawals WHERE run_id = NEW.run_id)`,
    message: 'A report is kept as its signature stands, or not at all.',
  },
  {
    table: 'reports',
    on: ['INSERT'],
    when: 'NEW.hash <> SHA2(NEW.pdf, 256)',
    message: 'The hash is not that of the report.',
  },
];

export const up: Step = ({ context }) => refuse(context, REFUSALS);
export const down: Step = ({ context }) => allowAgain(context, REFUSALS);
