import { array, mixed, number, object, string, tuple, type InferType } from 'yup';
import { LIMITS } from '../limits';
import type { Section } from '../surveys/types';

const offset = number().min(-1e6).max(1e6).required();

/**
 * One change over one or many sections: `PATCH /api/reaches/:reachId/sections`. What is left out stays.
 * Zones by offset suit one section; zones by bank (left of banks, between, right) suit many.
 */
export const sectionsChangeSchema = object({
  version: number().integer().min(1).required(),
  sectionIds: array()
    .of(string().max(LIMITS.textShort).required())
    .min(1, 'Choose at least one section.')
    .max(LIMITS.upload.sections)
    .required(),
  banks: tuple([offset, offset]).nullable().optional(),
  roughness: array()
    .of(
      tuple([
        offset,
        number()
          .min(0, "Manning's n cannot be negative.")
          .max(1, "Manning's n is below 1.")
          .required(),
      ]).required(),
    )
    .min(1)
    .max(100)
    .optional(),
  roughnessByBank: object({
    left: number().min(0).max(1).required(),
    channel: number().min(0).max(1).required(),
    right: number().min(0).max(1).required(),
  })
    .noUnknown()
    .optional()
    .default(undefined),
}).noUnknown();

export type SectionsChangeBody = InferType<typeof sectionsChangeSchema>;

const name = () => string().trim().max(LIMITS.textShort).required('Name the geometry.');

/** `POST /api/studies/:studyId/reaches`: a working geometry, copied from a reach of the study. */
export const newGeometrySchema = object({
  name: name(),
  copyOf: number().integer().positive().required('Choose what to copy.'),
}).noUnknown();

/** `PATCH /api/reaches/:reachId`. */
export const geometryNameSchema = object({ name: name() }).noUnknown();

/** Thousands of pairs are looked at by hand: a schema a number would take seconds. What they mean is `checkGeometry`'s. */
const isPairs = (value: unknown): value is [number, number][] =>
  Array.isArray(value) &&
  value.length <= LIMITS.upload.pointsPerSection + 1 &&
  value.every((pair) => Array.isArray(pair) && pair.length === 2 && pair.every(Number.isFinite));
const pairs = (message: string) => mixed<[number, number][]>(isPairs).typeError(message);
const level = () => number().min(-1e6).max(1e6);

const embankment = object({ offset: offset, crest: level().required() })
  .noUnknown()
  .optional()
  .default(undefined);

const section = object({
  id: string().trim().max(LIMITS.textShort).required('Name the section.'),
  chainage: number().min(-1e7).max(1e7).required(),
  points: pairs('Points are pairs of offset and elevation.').required(),
  roughness: pairs('Roughness is pairs of offset and n.').required(),
  banks: mixed<[number, number]>(
    (value): value is [number, number] => Array.isArray(value) && isPairs([value]),
  )
    .typeError('Bank marks are two offsets.')
    .nullable()
    .default(null),
  coordinates: pairs('Coordinates are pairs of easting and northing.').nullable().default(null),
  storage: array()
    .of(object({ from: offset, to: offset, flowsAbove: level().optional() }).noUnknown())
    .max(20)
    .optional(),
  embankments: object({ left: embankment, right: embankment })
    .noUnknown()
    .optional()
    .default(undefined),
}).noUnknown();

/** `PUT /api/reaches/:reachId/geometry`: sections that are new or different, names of those that are gone. */
export const geometryChangeSchema = object({
  version: number().integer().min(1).required(),
  sections: array().of(section.required()).max(LIMITS.upload.sections).default([]).required(),
  removed: array()
    .of(string().max(LIMITS.textShort).required())
    .max(LIMITS.upload.sections)
    .default([])
    .required(),
  /** What was done, for the history. */
  steps: array()
    .of(string().trim().max(LIMITS.textLong).required())
    .max(500)
    .default([])
    .required(),
}).noUnknown();

export interface GeometryChangeBody {
  version: number;
  sections: Section[];
  removed: string[];
  steps: string[];
}
