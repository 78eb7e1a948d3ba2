import type { Step } from '../database/columns';
import { allowAgain, refuse, type Refusal } from '../database/triggers';

const REFUSALS: Refusal[] = [
  {
    table: 'audit_rows',
    on: ['UPDATE', 'DELETE'],
    when: 'TRUE',
    message: 'The audit trail is only added to.',
  },
  {
    table: 'audit_head',
    on: ['DELETE'],
    when: 'TRUE',
    message: 'The audit trail keeps its end.',
  },
];

export const up: Step = ({ context }) => refuse(context, REFUSALS);
export const down: Step = ({ context }) => allowAgain(context, REFUSALS);
