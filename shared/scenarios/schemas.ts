import { array, number, object, string, type InferType, type ISchema } from 'yup';
import { LIMITS } from '../limits';
import { SCENARIO_CHANGES } from './changeScenario';
import { byKind, real, series, volumes } from './fields';
import { structureKinds, type StructureBody } from './structures/schemas';

/**
 * A scenario as it is typed and stored: SI. It may be incomplete (numbers null): it is saved as it is, and
 * `checkScenario` says what is missing before it can run. The schema holds shapes and bounds only.
 */

/** Shape functions are in `hydrographs.ts`; all flows include the base flow. Times in s, flows in m³/s. */
const generated = object({
  kind: string().oneOf(['generated']).required(),
  shape: string().oneOf(['triangle', 'gamma', 'nrcs']).required(),
  baseFlow: real(),
  peakFlow: real(),
  timeToPeak: real(),
  /** Triangle only: recession over rise; 1.67 is the SCS triangle. */
  recessionRatio: real(),
  /** Gamma only: exponent m of (t/Tp)^m exp(m (1 - t/Tp)). */
  gammaExponent: real(),
}).noUnknown();
const table = object({
  kind: string().oneOf(['table']).required(),
  times: series(),
  flows: series(),
}).noUnknown();
const stageTable = object({
  kind: string().oneOf(['stage']).required(),
  times: series(),
  stages: series(),
}).noUnknown();
const wall = object({ kind: string().oneOf(['wall']).required() }).noUnknown();

/**
 * A level pool behind a dam at the first section; what stands in the dam are the structures at that chainage. Its inflow
 * is a flood like any other.
 */
const reservoir = object({
  kind: string().oneOf(['reservoir']).required(),
  storage: object({ stages: series(), volumes: volumes() }).noUnknown().required(),
  initialStage: real(),
  inflow: byKind({ generated, table }),
  /** Flow beside the structures by stage of the pool; empty: none. */
  spillway: object({ stages: series(), flows: series() }).noUnknown().required(),
}).noUnknown();

const upstreamKinds = { generated, table, stage: stageTable, reservoir, wall };
const downstreamKinds = {
  normalDepth: object({
    kind: string().oneOf(['normalDepth']).required(),
    slope: real(),
  }).noUnknown(),
  stage: stageTable,
  rating: object({
    kind: string().oneOf(['rating']).required(),
    stages: series(),
    flows: series(),
  }).noUnknown(),
  criticalDepth: object({ kind: string().oneOf(['criticalDepth']).required() }).noUnknown(),
  open: object({ kind: string().oneOf(['open']).required() }).noUnknown(),
  wall,
};
const initialKinds = {
  steady: object({ kind: string().oneOf(['steady']).required() }).noUnknown(),
  still: object({ kind: string().oneOf(['still']).required(), stage: real() }).noUnknown(),
  profile: object({
    kind: string().oneOf(['profile']).required(),
    chainages: series(),
    stages: series(),
    flows: series(),
  }).noUnknown(),
  dam: object({
    kind: string().oneOf(['dam']).required(),
    chainage: real(),
    stageAbove: real(),
    /** null: dry below the dam. */
    stageBelow: real(),
  }).noUnknown(),
};

const lateral = object({
  name: string().trim().max(LIMITS.textShort).default(''),
  from: real(),
  to: real(),
  times: series(),
  flows: series(),
}).noUnknown();

/** Multiplies Manning's n of a stretch; several depths make it vary with depth, one keeps it. */
const roughnessFactor = object({
  from: real(),
  to: real(),
  part: string().oneOf(['all', 'channel', 'overbank']).default('all').required(),
  depths: series(),
  factors: series(),
}).noUnknown();

/** Shares of the change of velocity head that a stretch loses where it narrows and where it widens. */
const localLoss = object({
  from: real(),
  to: real(),
  contraction: real(),
  expansion: real(),
}).noUnknown();

const numerics = object({
  cellSize: real(),
  duration: real(),
  outputInterval: real(),
  order: number().oneOf([1, 2]).default(2).required(),
  courant: real(),
  dryDepth: real(),
  /** Left out in scenarios that were stored before there was a choice: uniform. */
  momentum: string().oneOf(['uniform', 'compound'] as const),
}).noUnknown();

export type Upstream =
  | InferType<typeof generated>
  | InferType<typeof table>
  | InferType<typeof stageTable>
  | ReservoirEnd
  | InferType<typeof wall>;
/** The inflow of a reservoir: of a shape, or a table. */
export type ReservoirInflow = InferType<typeof generated> | InferType<typeof table>;
export type ReservoirEnd = Omit<InferType<typeof reservoir>, 'inflow'> & {
  inflow: ReservoirInflow;
};
export type Downstream = {
  [K in keyof typeof downstreamKinds]: InferType<(typeof downstreamKinds)[K]>;
}[keyof typeof downstreamKinds];
export type InitialState = {
  [K in keyof typeof initialKinds]: InferType<(typeof initialKinds)[K]>;
}[keyof typeof initialKinds];
export type LateralInflow = InferType<typeof lateral>;
export type RoughnessFactorBody = InferType<typeof roughnessFactor>;
export type LocalLossBody = InferType<typeof localLoss>;
export type NumericsSettings = InferType<typeof numerics>;

export interface ScenarioBody {
  name: string;
  reachId: number;
  /** Clock time of t = 0, ISO 8601 in UTC; null where the study has none. */
  startsAt: string | null;
  note: string;
  upstream: Upstream;
  laterals: LateralInflow[];
  /** Left out in scenarios that were stored before there were any. */
  structures?: StructureBody[];
  /** The same. */
  roughnessFactors?: RoughnessFactorBody[];
  /** The same. */
  localLosses?: LocalLossBody[];
  downstream: Downstream;
  initial: InitialState;
  numerics: NumericsSettings;
}

export const scenarioSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the scenario.'),
  reachId: number().integer().positive().required('Choose the reach.'),
  startsAt: string()
    .nullable()
    .default(null)
    .test(
      'iso',
      'Write a date and time.',
      (value) => value == null || !Number.isNaN(Date.parse(value)),
    ),
  note: string().trim().max(LIMITS.textLong).default(''),
  upstream: byKind(upstreamKinds),
  laterals: array().of(lateral.required()).max(LIMITS.laterals).default([]).required(),
  structures: array()
    .of(byKind(structureKinds) as unknown as ISchema<StructureBody>)
    .max(LIMITS.structures)
    .default([])
    .required(),
  roughnessFactors: array()
    .of(roughnessFactor.required())
    .max(LIMITS.roughnessFactors)
    .default([])
    .required(),
  localLosses: array().of(localLoss.required()).max(LIMITS.localLosses).default([]).required(),
  downstream: byKind(downstreamKinds),
  initial: byKind(initialKinds),
  numerics: numerics.required(),
}).noUnknown();

/** `POST /api/studies/:studyId/scenarios`: only a name and a reach; the rest are proposals for the reach. */
export const newScenarioSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the scenario.'),
  reachId: number().integer().positive().required('Choose the reach.'),
}).noUnknown();

/** `PUT /api/scenarios/:scenarioId`. */
export const scenarioChangeSchema = object({
  version: number().integer().min(1).required(),
  body: scenarioSchema.required(),
}).noUnknown();

export const duplicateScenarioSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the copy.'),
  /** Made in the copy at once; null for none. */
  change: object({
    kind: string().oneOf(SCENARIO_CHANGES).required('Choose what changes.'),
    value: number()
      .typeError('Give a number.')
      .moreThan(0, 'Above 0.')
      .max(1e5, 'This is too much.')
      .required('Give a number.'),
  })
    .noUnknown()
    .nullable()
    .default(null),
}).noUnknown();
