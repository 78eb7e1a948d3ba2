import type { RequestHandler } from 'express';
import { ValidationError, type Schema } from 'yup';
import { invalid } from '../errors';
import { unknownPaths } from './unknownPaths';

/** Checks and casts the body by a schema of `shared/`; all faults at once. */
export const validate = (schema: Schema): RequestHandler =>
  async function validateBody(req, _res, next) {
    req.body = await check(schema, req.body ?? {});
    next();
  };

/**
 * The same for anything else: a query, a field of a form. Throws `invalid`. What the schema does not know is a fault: a
 * mistyped name would otherwise be left out without a word.
 */
export async function check<T>(schema: Schema<T>, value: unknown): Promise<T> {
  const known = await cast(schema, value);
  const unknown = unknownPaths(value, known);
  if (unknown.length === 0) return known;
  throw invalid(
    unknown.map((path) => ({ path, message: 'Nothing of this name is known here. Leave it out.' })),
  );
}

async function cast<T>(schema: Schema<T>, value: unknown): Promise<T> {
  try {
    return await schema.validate(value, { abortEarly: false });
  } catch (error) {
    if (!(error instanceof ValidationError)) throw error;
    const inner = error.inner.length > 0 ? error.inner : [error];
    throw invalid(inner.map(({ path, message }) => ({ path: path ?? '', message })));
  }
}
