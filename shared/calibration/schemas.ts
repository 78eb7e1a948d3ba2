import { array, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';
import { MARK_CONFIDENCES, MARK_KINDS } from './marks';

export const OBSERVATION_LIMITS = { marksPerStudy: 500, gaugesPerStudy: 50 } as const;

const flood = () => string().trim().max(LIMITS.textShort).default('');
const chainage = () =>
  number()
    .typeError('Give its chainage.')
    .min(-1e7, 'This is no chainage.')
    .max(1e7, 'This is no chainage.')
    .required('Give its chainage.');

export const markSchema = object({
  chainage: chainage(),
  level: number()
    .typeError('Give the level of the water.')
    .min(-1000, 'This is no level on the ground.')
    .max(10_000, 'This is no level on the ground.')
    .required('Give the level of the water.'),
  kind: string().oneOf(MARK_KINDS, 'Choose what was seen.').required('Choose what was seen.'),
  confidence: string()
    .oneOf(MARK_CONFIDENCES, 'Say how sure it is.')
    .required('Say how sure it is.'),
  flood: flood(),
  observedOn: string()
    .nullable()
    .default(null)
    .transform((value: unknown) => (value === '' ? null : value))
    .test(
      'day',
      'Write the day as 2024-01-09.',
      (value) => value == null || (/^\d{4}-\d{2}-\d{2}$/.test(value) && isDay(value)),
    ),
  note: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

const isDay = (text: string) => {
  const at = Date.parse(`${text}T00:00:00Z`);
  return Number.isFinite(at) && new Date(at).toISOString().startsWith(text);
};

/** `POST /api/studies/:studyId/marks`: all of them or none. */
export const marksSchema = object({
  marks: array()
    .of(markSchema.required())
    .min(1, 'Give at least one mark.')
    .max(OBSERVATION_LIMITS.marksPerStudy)
    .required(),
}).noUnknown();

const series = object({
  times: array().of(number().min(-1e9).max(1e9).required()).max(LIMITS.hydrographPoints).required(),
  values: array()
    .of(number().min(-1e6).max(1e7).required())
    .max(LIMITS.hydrographPoints)
    .required(),
})
  .noUnknown()
  .nullable()
  .default(null)
  .test('pairs', 'Each time needs one value.', (value) => {
    return value === null || value.times.length === value.values.length;
  })
  .test('two', 'A record needs at least two values.', (value) => {
    return value === null || value.times.length >= 2;
  })
  .test('rising', 'Times grow from row to row.', (value) => {
    return value === null || value.times.every((t, i) => i === 0 || t > value.times[i - 1]);
  });

export const gaugeSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the gauge.'),
  chainage: chainage(),
  flood: flood(),
  startsAt: string()
    .nullable()
    .default(null)
    .transform((value: unknown) => (value === '' ? null : value))
    .test(
      'iso',
      'Write a date and time.',
      (value) => value == null || !Number.isNaN(Date.parse(value)),
    ),
  stage: series,
  flow: series,
})
  .noUnknown()
  .test('some', function someRecord(value) {
    if (value.stage || value.flow) return true;
    return this.createError({ path: 'stage', message: 'Give stage, flow or both against time.' });
  });

/** Fields beside the file of `POST /api/studies/:studyId/marks/read`. */
export const markFileSchema = object({
  flood: flood(),
}).noUnknown();

/** `GET /api/runs/:runId/residuals`. Left out: the flood that is reported, else the only one there is. */
export const residualsQuerySchema = object({
  flood: string().trim().max(LIMITS.textShort).optional(),
}).noUnknown();

/** `PUT /api/runs/:runId/observed`: what its report prints; null for nothing. */
export const reportedSchema = object({
  flood: string().trim().max(LIMITS.textShort).nullable().defined(),
}).noUnknown();

export type MarkBody = InferType<typeof markSchema>;
export type GaugeBody = InferType<typeof gaugeSchema>;
