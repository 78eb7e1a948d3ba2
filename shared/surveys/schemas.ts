import { array, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';
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

/** The other fields of the multipart body. */
export const surveyFormSchema = object({
  match: string().max(20_000).optional(),
  note: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

export type MatchChoiceBody = InferType<typeof matchChoiceSchema>;
