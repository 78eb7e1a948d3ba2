import { array, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';

const words = (missing: string) => string().trim().max(LIMITS.textLong).required(missing);

/** `POST /api/runs/:runId/review`: sent for checking; also again after it was returned. */
export const sendForCheckSchema = object({
  sentTo: number().integer().positive().nullable().default(null),
  method: words('Say how it was computed and why so.'),
  assumptions: words('Say what was assumed.'),
  limits: words('Say where the result ends.'),
}).noUnknown();

/** `PUT /api/runs/:runId/review/answers`: the modeller's words on items of the checklist. */
export const answersSchema = object({
  answers: array()
    .of(
      object({
        id: string().max(60).required(),
        answer: string().trim().max(LIMITS.textLong).default(''),
      })
        .noUnknown()
        .required(),
    )
    .max(100)
    .required(),
}).noUnknown();

/** `POST /api/runs/:runId/review/points`. */
export const pointSchema = object({
  chainage: number().min(-1e7).max(1e7).nullable().default(null),
  time: number().min(0).max(1e9).nullable().default(null),
  text: words('Write the point.'),
}).noUnknown();

/** `POST /api/points/:pointId/answer`, `/close`, `/reopen`. */
export const pointEntrySchema = object({
  text: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

/** `POST /api/runs/:runId/review/return`, `/withdraw`. */
export const reasonSchema = object({ reason: words('Give the reason.') }).noUnknown();

/** `POST /api/runs/:runId/review/sign`. The statement is shown before it is confirmed, word for word. */
export const signSchema = object({
  statement: words('The statement is missing.'),
  password: string().max(LIMITS.password.max).required('Write your password again.'),
}).noUnknown();

/** `POST /api/runs/:runId/review/issue`: what the client is to see. */
export const issueSchema = object({
  stationIds: array()
    .of(number().integer().positive().required())
    .min(1, 'Choose at least one station for the client.')
    .max(LIMITS.stationsPerStudy)
    .required(),
  message: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

export type SendForCheckBody = InferType<typeof sendForCheckSchema>;
export type AnswersBody = InferType<typeof answersSchema>;
export type PointBody = InferType<typeof pointSchema>;
export type PointEntryBody = InferType<typeof pointEntrySchema>;
export type ReasonBody = InferType<typeof reasonSchema>;
export type SignBody = InferType<typeof signSchema>;
export type IssueBody = InferType<typeof issueSchema>;
