import { array, object, string, type InferType } from 'yup';

/** More cases than there are. */
const MOST = 200;

/** `POST /api/verification-cases/runs`: the cases to be routed; left out: all. */
export const runCasesSchema = object({
  caseIds: array()
    .of(string().required().max(80))
    .min(1, 'Name one case at least, or leave the list out for all.')
    .max(MOST)
    .optional(),
}).noUnknown();

/** `GET /api/verification-cases/result` and `values.csv`. */
export const caseQuerySchema = object({
  caseId: string().required('Name the case.').max(80),
}).noUnknown();

export type RunCasesBody = InferType<typeof runCasesSchema>;
