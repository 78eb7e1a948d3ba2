import { object, string, type InferType } from 'yup';
import { CULVERT_INLET_NAMES, PIER_SHAPE_NAMES } from '../../case/structures';
import { LIMITS } from '../../limits';
import { real, realVolume, series } from '../fields';

/**
 * Structures of a scenario as they are typed and stored: SI, numbers null while they are missing. A crest is two columns,
 * offsets across the river and levels above the datum. What each means is said in `case/structures.ts`.
 */
const standing = <K extends string>(kind: K) => ({
  kind: string()
    .oneOf([kind] as const)
    .required(),
  id: string().trim().max(LIMITS.structureName).default(''),
  chainage: real(),
  /** Where its numbers come from, and why; it goes into the frozen case and the report. */
  note: string().trim().max(LIMITS.textLong).default(''),
});
const crest = { offsets: series(), levels: series() };

const weir = object({
  ...standing('weir'),
  ...crest,
  form: string()
    .oneOf(['broad', 'sharp'] as const)
    .required(),
  /** null: 1 for a broad crest, Rehbock's for a sharp one. */
  coefficient: real(),
}).noUnknown();

const sluice = object({
  ...standing('sluice'),
  width: real(),
  sill: real(),
  times: series(),
  openings: series(),
  /** null: 0.611. */
  contraction: real(),
}).noUnknown();

const culvert = object({
  ...standing('culvert'),
  shape: string()
    .oneOf(['circular', 'box'] as const)
    .required(),
  /** Of a circular barrel. */
  diameter: real(),
  /** Of a box. */
  width: real(),
  height: real(),
  barrels: real(),
  n: real(),
  length: real(),
  invertUp: real(),
  invertDown: real(),
  inlet: string().oneOf(CULVERT_INLET_NAMES).required(),
  /** What water flows over; empty: none. */
  ...crest,
  crestCoefficient: real(),
}).noUnknown();

const bridge = object({
  ...standing('bridge'),
  piers: string().oneOf(PIER_SHAPE_NAMES).required(),
  obstructed: real(),
  soffit: real(),
  contraction: real(),
  /** The deck; empty: water never flows over it. */
  ...crest,
  deckCoefficient: real(),
}).noUnknown();

/** What the published regressions need beyond the breach itself. It is kept as the ground of the choice. */
const dam = object({
  height: real(),
  waterDepth: real(),
  waterVolume: realVolume(),
  storage: realVolume(),
  crestWidth: real(),
  /** Of both faces of the dam together, horizontal to vertical. */
  faceSlopes: real(),
  embankment: string()
    .oneOf(['earthfill', 'nonEarthfill'] as const)
    .default('earthfill')
    .required(),
  erodibility: string()
    .oneOf(['high', 'low'] as const)
    .default('high')
    .required(),
}).noUnknown();

const breach = object({
  ...standing('breach'),
  ...crest,
  /** What makes it fail: the time, or the stage of the water above it. */
  trigger: string()
    .oneOf(['time', 'stage'] as const)
    .required(),
  triggerTime: real(),
  triggerStage: real(),
  mode: string()
    .oneOf(['overtopping', 'piping'] as const)
    .required(),
  growth: string()
    .oneOf(['linear', 'sine'] as const)
    .required(),
  formationTime: real(),
  bottomWidth: real(),
  bottomLevel: real(),
  sideSlope: real(),
  /** null: of the middle of the crest. */
  centre: real(),
  startLevel: real(),
  weirCoefficient: real(),
  orificeCoefficient: real(),
  dam: dam.required(),
  /** The estimate that width and time were taken from (`breach/breachEstimates.ts`); empty: own values. */
  estimate: string().max(LIMITS.structureName).default(''),
}).noUnknown();

export const structureKinds = { weir, sluice, culvert, bridge, breach };

export type WeirBody = InferType<typeof weir>;
export type SluiceBody = InferType<typeof sluice>;
export type CulvertBody = InferType<typeof culvert>;
export type BridgeBody = InferType<typeof bridge>;
export type BreachBody = InferType<typeof breach>;
export type DamData = InferType<typeof dam>;
export type StructureBody = WeirBody | SluiceBody | CulvertBody | BridgeBody | BreachBody;
