import { number, object, string, type InferType } from 'yup';

/** `GET /api/audit?before=&actor=&action=` and `GET /api/audit.csv?actor=&action=`. */
export const auditQuerySchema = object({
  before: number().integer().positive().optional(),
  /** A part of the name. */
  actor: string().trim().max(120).optional(),
  /** The action, or what it begins with: `run` finds `run.signed`. */
  action: string().trim().max(60).optional(),
}).noUnknown();

export type AuditQuery = InferType<typeof auditQuerySchema>;
