import type { RequestHandler } from 'express';
import { ValidationError, type Schema } from 'yup';
import { invalid } from '../errors';

/** Checks and casts the body by a schema of `shared/`; all faults at once. Unknown keys are dropped. */
export const validate = (schema: Schema): RequestHandler =>
  async function validateBody(req, _res, next) {
    req.body = await check(schema, req.body ?? {});
    next();
  };

/** The same for anything else: a query, a field of a form. Throws `invalid`. */
export async function check<T>(schema: Schema<T>, value: unknown): Promise<T> {
  try {
    return await schema.validate(value, { abortEarly: false });
  } catch (error) {
    if (!(error instanceof ValidationError)) throw error;
    const inner = error.inner.length > 0 ? error.inner : [error];
    throw invalid(inner.map(({ path, message }) => ({ path: path ?? '', message })));
  }
}
