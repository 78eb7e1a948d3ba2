import { array, number, object } from 'yup';

export const COMPARED_RUNS = { min: 2, max: 4 } as const;

/** `GET /api/studies/:studyId/comparison`: ids of runs between commas. */
export const comparisonQuerySchema = object({
  runs: array()
    .transform((value: unknown, given: unknown) =>
      typeof given === 'string' ? given.split(',').map(Number) : value,
    )
    .of(number().integer().positive().required())
    .min(COMPARED_RUNS.min, 'Choose two runs or more.')
    .max(COMPARED_RUNS.max, 'Choose four runs at most.')
    .test('once', 'Each run stands once.', (ids) => new Set(ids).size === (ids?.length ?? 0))
    .required('Choose two runs or more.'),
}).noUnknown();
