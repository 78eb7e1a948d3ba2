import type { Step } from '../database/columns';
import { allowAgain, refuse, type Refusal } from '../database/triggers';

const SIGNED = 'This run is signed; nothing of it changes.';
const KEPT = 'Signatures, issues, withdrawals and confirmations are kept as they are.';
const signedRun = (id: string) => `EXISTS (SELECT 1 FROM sign_offs WHERE run_id = ${id})`;
const signedReview = (id: string) => `EXISTS (SELECT 1 FROM sign_offs WHERE review_id = ${id})`;
const signedPoint = (id: string) =>
  `EXISTS (SELECT 1 FROM sign_offs JOIN review_points ON review_points.review_id = sign_offs.review_id
    WHERE review_points.id = ${id})`;

/** From the signature on: the frozen case, the results, the check and its points. */
const REFUSALS: Refusal[] = [
  { table: 'runs', on: ['UPDATE', 'DELETE'], when: signedRun('OLD.id'), message: SIGNED },
  {
    table: 'run_blocks',
    on: ['INSERT', 'UPDATE', 'DELETE'],
    when: signedRun('ROW.run_id'),
    message: SIGNED,
  },
  { table: 'run_blocks', on: ['UPDATE'], when: signedRun('OLD.run_id'), message: SIGNED },
  { table: 'reviews', on: ['UPDATE', 'DELETE'], when: signedReview('OLD.id'), message: SIGNED },
  {
    table: 'review_points',
    on: ['INSERT', 'UPDATE', 'DELETE'],
    when: signedReview('ROW.review_id'),
    message: SIGNED,
  },
  {
    table: 'review_points',
    on: ['UPDATE'],
    when: signedReview('OLD.review_id'),
    message: SIGNED,
  },
  {
    table: 'review_point_entries',
    on: ['INSERT', 'UPDATE', 'DELETE'],
    when: signedPoint('ROW.point_id'),
    message: SIGNED,
  },
  {
    table: 'review_point_entries',
    on: ['UPDATE'],
    when: signedPoint('OLD.point_id'),
    message: SIGNED,
  },
  ...['sign_offs', 'issues', 'withdrawals', 'client_reads'].map((table) => ({
    table,
    on: ['UPDATE' as const, 'DELETE' as const],
    when: 'TRUE',
    message: KEPT,
  })),
];

export const up: Step = ({ context }) => refuse(context, REFUSALS);
export const down: Step = ({ context }) => allowAgain(context, REFUSALS);
