import { number, object, string, type InferType } from 'yup';

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

/** `GET /api/runs/:runId/along`: arrival by a rise over the first stage (m), by a stage (m) or by a flow (m³/s). */
export const alongQuerySchema = object({
  threshold: string().oneOf(['rise', 'stage', 'flow']).default('rise').required(),
  value: number()
    .typeError('Give the threshold as a number.')
    .min(-1e9)
    .max(1e9)
    .required('Give the threshold.')
    .when('threshold', {
      is: 'rise',
      then: (value) => value.moreThan(0, 'The rise must be greater than 0.'),
    }),
}).noUnknown();

export type AlongQuery = InferType<typeof alongQuerySchema>;
