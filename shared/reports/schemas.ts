import { boolean, object, string, type InferType } from 'yup';
import { PAPERS } from './types';

/** What is printed anywhere: on which paper. */
export const paperQuerySchema = object({
  paper: string()
    .oneOf(PAPERS, `Choose ${PAPERS.join(' or ')}.`)
    .default('A4'),
}).noUnknown();

/** `GET /api/runs/:runId/report.pdf`. */
export const reportQuerySchema = paperQuerySchema
  .shape({
    annex: boolean().typeError('Say true or false.').default(false),
  })
  .noUnknown();

export type ReportQuery = InferType<typeof reportQuerySchema>;
