import { array, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';
import { UNIT_SYSTEMS } from '../units/units';
import { LEVEL_KINDS, type LevelKind } from './stationLevels';

export const studySchema = object({
  title: string().trim().max(LIMITS.textShort).required('Give the study a title.'),
  clientName: string().trim().max(LIMITS.textShort).default(''),
  place: string().trim().max(LIMITS.textShort).default(''),
  verticalDatum: string()
    .trim()
    .max(LIMITS.textShort)
    .required('Name the datum that the elevations refer to.'),
  /** Name of what eastings and northings refer to; empty where there are none or nobody has named it. */
  coordinateSystem: string().trim().max(LIMITS.textShort).default(''),
  unitSystem: string().oneOf(UNIT_SYSTEMS).default('metric').required(),
  purpose: string().trim().max(LIMITS.textLong).default(''),
}).noUnknown();

export const memberSchema = object({
  userId: number().integer().positive().required(),
  as: string().oneOf(['surveyor', 'client']).required(),
}).noUnknown();

export const stationSchema = object({
  name: string().trim().max(LIMITS.textShort).required('Name the place.'),
  chainage: number().min(-1e7).max(1e7).required('Give its chainage.'),
  /** Left out: as they are. */
  levels: array()
    .of(
      object({
        kind: string()
          .oneOf(Object.keys(LEVEL_KINDS) as LevelKind[])
          .required('Choose what it is the level of.'),
        level: number()
          .min(-500)
          .max(9000)
          .required('Give the level above datum, or remove this line.'),
        note: string().trim().max(LIMITS.textShort).default(''),
      }).noUnknown(),
    )
    .max(LIMITS.levelsPerStation)
    .optional(),
}).noUnknown();

export type StudyBody = InferType<typeof studySchema>;
export type MemberBody = InferType<typeof memberSchema>;
export type StationBody = InferType<typeof stationSchema>;
