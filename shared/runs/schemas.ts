import { number, object, type InferType } from 'yup';

/** `GET /api/runs/:runId/series`. */
export const seriesQuerySchema = object({
  chainage: number()
    .typeError('Give the chainage in m.')
    .min(-1e9)
    .max(1e9)
    .required('Give the chainage in m.'),
}).noUnknown();

/** `GET /api/runs/:runId/surface`. */
export const surfaceQuerySchema = object({
  places: number().integer().min(2).max(2000).default(400),
  moments: number().integer().min(2).max(600).default(200),
}).noUnknown();

export type SurfaceQuery = InferType<typeof surfaceQuerySchema>;
