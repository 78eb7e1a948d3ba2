import type { Step } from '../database/columns';
import { allowAgain, refuse, type Refusal } from '../database/triggers';

const runWhere = (condition: string) =>
  `(SELECT COUNT(*) FROM runs WHERE id = NEW.run_id AND ${condition}) = 0`;

/** What may be signed, issued, withdrawn and confirmed, held by the database as well as by the services. */
const REFUSALS: Refusal[] = [
  {
    table: 'sign_offs',
    on: ['INSERT'],
    when: runWhere('requested_by <> NEW.signed_by'),
    message: 'Nobody signs a run that they asked for.',
  },
  {
    table: 'sign_offs',
    on: ['INSERT'],
    when: runWhere(
      "state = 'routed' AND case_hash = NEW.case_hash AND solver_version = NEW.solver_version",
    ),
    message: 'What is signed is not what was routed.',
  },
  {
    table: 'sign_offs',
    on: ['INSERT'],
    when: `(SELECT COUNT(*) FROM runs JOIN studies ON studies.id = runs.study_id
      JOIN users ON users.firm_id = studies.firm_id
      WHERE runs.id = NEW.run_id AND users.id = NEW.signed_by) = 0`,
    message: 'Only people of the firm sign its runs.',
  },
  {
    table: 'sign_offs',
    on: ['INSERT'],
    when: "(SELECT COUNT(*) FROM reviews WHERE id = NEW.review_id AND run_id = NEW.run_id AND state = 'inCheck') = 0",
    message: 'The run is not in check.',
  },
  {
    table: 'sign_offs',
    on: ['INSERT'],
    when: "EXISTS (SELECT 1 FROM review_points WHERE review_id = NEW.review_id AND state <> 'closed')",
    message: 'Points of the check are open.',
  },
  {
    table: 'issues',
    on: ['INSERT'],
    when: `NOT EXISTS (SELECT 1 FROM sign_offs WHERE run_id = NEW.run_id)
      OR EXISTS (SELECT 1 FROM withdrawals WHERE run_id = NEW.run_id)`,
    message: 'Only what is signed and not withdrawn is issued.',
  },
  {
    table: 'withdrawals',
    on: ['INSERT'],
    when: 'NOT EXISTS (SELECT 1 FROM sign_offs WHERE run_id = NEW.run_id)',
    message: 'Only what is signed is withdrawn.',
  },
  {
    table: 'client_reads',
    on: ['INSERT'],
    when: 'NOT EXISTS (SELECT 1 FROM issues WHERE run_id = NEW.run_id)',
    message: 'Only what is issued is read.',
  },
];

export const up: Step = ({ context }) => refuse(context, REFUSALS);
export const down: Step = ({ context }) => allowAgain(context, REFUSALS);
