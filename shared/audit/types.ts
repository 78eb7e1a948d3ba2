/** One row of the audit trail: who did what, when, from where, to which record. `GET /api/audit`. */
export interface AuditRow {
  id: number;
  at: string;
  /** null: nobody signed in, e.g. a refused sign-in. */
  actor: string | null;
  /** Address the request came from. */
  from: string | null;
  /** e.g. `survey.accepted`. */
  action: string;
  /** In words, e.g. `Revision 3 of Lower Veshall taken in`. */
  words: string;
  record: { kind: string; id: number } | null;
  outcome: 'done' | 'refused';
  /** SHA-256 over this row and the hash of the one before, hex. */
  hash: string;
}
export interface AuditPage {
  rows: AuditRow[];
  /** Pass as `before` for the next page; null: this is the end. */
  next: number | null;
}
