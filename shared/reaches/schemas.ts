import { array, number, object, string, tuple, type InferType } from 'yup';
import { LIMITS } from '../limits';

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
