import { promisify } from 'node:util';
import { constants, gzip } from 'node:zlib';
import type { Request, Response } from 'express';

const zip = promisify(gzip);

/** Sends numbers in binary, compressed where the asker takes it: `compression` passes over types that it does not know. */
export async function sendCompressed(req: Request, res: Response, bytes: Buffer): Promise<void> {
  res.type('application/octet-stream').vary('Accept-Encoding');
  if (!req.acceptsEncodings('gzip')) return void res.send(bytes);
  res.set('Content-Encoding', 'gzip');
  res.send(await zip(bytes, { level: constants.Z_BEST_SPEED }));
}
