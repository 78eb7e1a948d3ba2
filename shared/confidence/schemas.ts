import { array, mixed, number, object, string, type InferType } from 'yup';
import {
  DISTRIBUTION_KINDS,
  distributionFault,
  type Distribution,
  type DistributionKind,
} from './distributions';
import { PARAMETER_KEYS, PARAMETERS, type ParameterKey } from './parameters';

export const CONFIDENCE_LIMITS = {
  members: { min: 20, max: 500 },
  stations: 12,
  /** Fewer cells on the coarsest grid tell nothing. */
  coarsestCells: 8,
} as const;

const stationIds = array()
  .of(number().integer().required())
  .max(
    CONFIDENCE_LIMITS.stations,
    `Choose at most ${CONFIDENCE_LIMITS.stations} stations; the others can have a set of their own.`,
  )
  .default([]);
const name = string().trim().max(120, 'Keep the name to 120 characters.').default('');
const cellSize = number()
  .typeError('Give the cell size.')
  .positive('The cell size must be above 0.')
  .nullable()
  .default(null);
const finite = (what: string) =>
  number().typeError(`Give ${what}.`).required(`Give ${what}.`).min(-1e4).max(1e4);

/** `POST /api/runs/:runId/confidence/convergence`. */
export const convergenceSchema = object({
  name,
  stationIds,
  /** The finest grid has the cells of the run, or half their size. */
  finest: string().oneOf(['same', 'half']).default('same').required(),
}).noUnknown();

/** `POST /api/runs/:runId/confidence/sensitivity`. */
export const sensitivitySchema = object({
  name,
  stationIds,
  /** m; null: the cells of the run. */
  cellSize,
  parameters: array()
    .of(
      object({
        key: string().oneOf(PARAMETER_KEYS).required(),
        low: finite('the lower value'),
        high: finite('the upper value'),
      })
        .noUnknown()
        .test('sides', '', ({ key, low, high }, { createError, path }) => {
          const { neutral, measure } = PARAMETERS[key];
          if (measure === 'factor' && low <= 0)
            return createError({ path: `${path}.low`, message: 'A factor must be above 0.' });
          if (low > neutral)
            return createError({
              path: `${path}.low`,
              message: `The lower value must not be above ${neutral}, which changes nothing.`,
            });
          if (high < neutral)
            return createError({
              path: `${path}.high`,
              message: `The upper value must not be below ${neutral}, which changes nothing.`,
            });
          return low < high || createError({ path: `${path}.high`, message: 'Give two values.' });
        }),
    )
    .min(1, 'Choose at least one input to vary.')
    .max(PARAMETER_KEYS.length)
    .test('once', 'Each input is varied once.', (given) => onlyOnce(given))
    .default([]),
}).noUnknown();

const DISTRIBUTION_FIELDS: Record<DistributionKind, readonly string[]> = {
  normal: ['mean', 'deviation'],
  lognormal: ['median', 'spread'],
  triangular: ['low', 'mode', 'high'],
  uniform: ['low', 'high'],
};

const distribution = mixed<Distribution>((value): value is Distribution => {
  const given = value as Record<string, unknown> | null;
  const kind = given?.kind as DistributionKind;
  return DISTRIBUTION_KINDS.includes(kind)
    ? DISTRIBUTION_FIELDS[kind].every((field) => Number.isFinite(given![field]))
    : false;
})
  .typeError('Choose a distribution and give its numbers.')
  .required('Choose a distribution.');

/** `POST /api/runs/:runId/confidence/ensemble`. */
export const ensembleSchema = object({
  name,
  stationIds,
  /** m; null: the cells of the run. */
  cellSize,
  members: number()
    .typeError('Give the number of members.')
    .integer('Give a whole number of members.')
    .min(CONFIDENCE_LIMITS.members.min, 'An ensemble has 20 members or more.')
    .max(CONFIDENCE_LIMITS.members.max, 'An ensemble has at most 500 members.')
    .required('Give the number of members.'),
  seed: number()
    .typeError('Give the seed: any whole number.')
    .integer('The seed is a whole number.')
    .min(0)
    .max(2 ** 31 - 1)
    .required('Give the seed: any whole number.'),
  parameters: array()
    .of(
      object({ key: string().oneOf(PARAMETER_KEYS).required(), distribution })
        .noUnknown()
        .test('distribution', '', ({ key, distribution: given }, { createError, path }) => {
          if (!given) return true;
          const message = distributionFault(given, PARAMETERS[key].measure);
          return message === null || createError({ path: `${path}.distribution`, message });
        }),
    )
    .min(1, 'Choose at least one input to vary.')
    .max(PARAMETER_KEYS.length)
    .test('once', 'Each input is varied once.', (given) => onlyOnce(given))
    .default([]),
}).noUnknown();

const onlyOnce = (given: { key?: ParameterKey }[] | undefined): boolean =>
  new Set(given?.map(({ key }) => key)).size === (given?.length ?? 0);

export type ConvergenceSettings = InferType<typeof convergenceSchema>;
export type SensitivitySettings = InferType<typeof sensitivitySchema>;
export type EnsembleSettings = InferType<typeof ensembleSchema>;
export type ConfidenceSettings = ConvergenceSettings | SensitivitySettings | EnsembleSettings;

export const CONFIDENCE_KINDS = ['convergence', 'sensitivity', 'ensemble'] as const;
export type ConfidenceKind = (typeof CONFIDENCE_KINDS)[number];

export interface SettingsOf {
  convergence: ConvergenceSettings;
  sensitivity: SensitivitySettings;
  ensemble: EnsembleSettings;
}
export const CONFIDENCE_SCHEMAS = {
  convergence: convergenceSchema,
  sensitivity: sensitivitySchema,
  ensemble: ensembleSchema,
} as const;

/** `GET /api/task-sets/:taskSetId/result.csv`. */
export const confidenceCsvQuerySchema = object({
  part: string().oneOf(['result', 'members']).default('result').required(),
}).noUnknown();
