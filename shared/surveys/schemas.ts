import { array, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';
import { UNIT_SYSTEMS } from '../units/units';
import { LENGTH_UNITS, SURVEY_FIELDS } from './types';

/** The `match` field of the multipart body, as JSON. */
export const matchChoiceSchema = object({
  columns: array()
    .of(
      object({
        column: number().integer().min(0).max(200).required(),
        field: string().oneOf(SURVEY_FIELDS).nullable().default(null),
        unit: string().oneOf(LENGTH_UNITS).nullable().default(null),
      }).noUnknown(),
    )
    .max(200)
    .required(),
  decimal: string().oneOf(['auto', 'point', 'comma']).default('auto').required(),
}).noUnknown();

/** The other fields of the multipart body; with `uploadId` in the place of the file the body is JSON. */
export const surveyFormSchema = object({
  uploadId: number().integer().positive().optional(),
  match: string().max(20_000).optional(),
  note: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

/** `GET /api/templates/…`: what its lengths are in. */
export const templateQuerySchema = object({
  units: string().oneOf(UNIT_SYSTEMS).default('metric').required(),
}).noUnknown();

/** `POST /api/surveys/:surveyId/decision`. */
export const surveyDecisionSchema = object({
  decision: string().oneOf(['accepted', 'returned']).required(),
  remarks: string()
    .trim()
    .max(LIMITS.textLong)
    .default('')
    .when('decision', {
      is: 'returned',
      then: (remarks) => remarks.required('Say what is to be mended.'),
    }),
}).noUnknown();

export type SurveyDecisionBody = InferType<typeof surveyDecisionSchema>;
export type MatchChoiceBody = InferType<typeof matchChoiceSchema>;
