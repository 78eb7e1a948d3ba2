import { object, string, type InferType } from 'yup';
import { PAPERS } from './types';

/** `GET /api/runs/:runId/report.pdf`. */
export const reportQuerySchema = object({
  paper: string()
    .oneOf(PAPERS, `Choose ${PAPERS.join(' or ')}.`)
    .default('A4'),
}).noUnknown();

export type ReportQuery = InferType<typeof reportQuerySchema>;
