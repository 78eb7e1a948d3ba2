import { array, boolean, number, object, string } from 'yup';
import { LIMITS } from '../../limits';

export const SEARCH_LIMITS = {
  stretches: 6,
  evaluations: { min: 5, max: 300 },
  /** Of a multiplier. */
  factor: { min: 0.2, max: 5 },
} as const;

const { factor, evaluations } = SEARCH_LIMITS;

const stretch = object({
  name: string().trim().max(LIMITS.textShort).default(''),
  from: number().typeError('Give where it begins.').required('Give where it begins.'),
  to: number()
    .typeError('Give where it ends.')
    .required('Give where it ends.')
    .test('order', 'It ends below where it begins.', function order(value) {
      return value > (this.parent as { from: number }).from;
    }),
  part: string()
    .oneOf(['all', 'channel', 'overbank'])
    .default('all')
    .required('Choose the part of the section.'),
  low: number()
    .typeError('Give the least multiplier.')
    .min(factor.min, `Not below ${factor.min}.`)
    .max(1, 'The least is 1 at most.')
    .required('Give the least multiplier.'),
  high: number()
    .typeError('Give the largest multiplier.')
    .min(1, 'The largest is 1 at least.')
    .max(factor.max, `Not above ${factor.max}.`)
    .required('Give the largest multiplier.')
    .test('room', 'Leave room between the least and the largest.', function room(value) {
      return value > 1.02 * (this.parent as { low: number }).low;
    }),
}).noUnknown();

/** `POST /api/runs/:runId/calibrations`. */
export const searchSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the search.'),
  flood: string().trim().max(LIMITS.textShort).default(''),
  use: object({
    marks: boolean().default(true).required(),
    gaugeStage: boolean().default(true).required(),
    gaugeFlow: boolean().default(false).required(),
  })
    .noUnknown()
    .required()
    .test('some', 'Choose what the search should fit.', ({ marks, gaugeStage, gaugeFlow }) =>
      [marks, gaugeStage, gaugeFlow].some(Boolean),
    ),
  stretches: array()
    .of(stretch.required())
    .min(1, 'Give at least one stretch.')
    .max(SEARCH_LIMITS.stretches, `At most ${SEARCH_LIMITS.stretches} stretches.`)
    .required(),
  /** Runs that the search may take; four more a stretch then tell how flat the optimum is. */
  evaluations: number()
    .typeError('Give a number of runs.')
    .integer('Whole runs only.')
    .min(evaluations.min, `At least ${evaluations.min} runs.`)
    .max(evaluations.max, `At most ${evaluations.max} runs.`)
    .required('Give a number of runs.'),
  /** Cells of the run times this: coarser ones are quicker, and less exact. */
  coarser: number().oneOf([1, 2, 4, 8], 'Choose the cells.').default(1).required(),
}).noUnknown();

/** `POST /api/task-sets/:taskSetId/scenario`. */
export const fromSearchSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the scenario.'),
}).noUnknown();
