import type { Request } from 'express';
import { notFound } from '../errors';

/** An id in the address; anything but a positive integer is the address of nothing. */
export function pathId(req: Request, name: string): number {
  const text = req.params[name];
  const id = typeof text === 'string' && /^[1-9]\d{0,15}$/.test(text) ? Number(text) : NaN;
  if (!Number.isSafeInteger(id)) throw notFound();
  return id;
}
