import { raw, type Request, type RequestHandler, type Response } from 'express';
import { LIMITS } from '../../shared/limits';
import { AppError, invalid } from '../errors';

/** The open protocol for resumable uploads, core with creation, termination and expiration: tus.io/protocols, 1.0.0. */
export const TUS_VERSION = '1.0.0';
const PART_TYPE = 'application/offset+octet-stream';

/** Every answer names the version; a request of another is refused with the one that is spoken here. */
export const tus: RequestHandler = (req, res, next) => {
  res.setHeader('Tus-Resumable', TUS_VERSION);
  if (req.get('Tus-Resumable') !== TUS_VERSION) {
    res.setHeader('Tus-Version', TUS_VERSION);
    res.status(412).end();
    return;
  }
  next();
};

/** The bytes of one part. One that breaks off half-way is not kept: it comes again whole. */
export const readPart = raw({ type: PART_TYPE, limit: 8 * LIMITS.upload.partBytes });

export function partOf(req: Request): { place: number; bytes: Buffer } {
  if (!Buffer.isBuffer(req.body))
    throw invalid([{ path: 'Content-Type', message: `Send parts as ${PART_TYPE}.` }]);
  return { place: wholeNumber(req, 'Upload-Offset'), bytes: req.body };
}

/** What is announced: the size in bytes, and the name in `Upload-Metadata`. */
export function announcedFile(req: Request): { name: string; size: number } {
  const size = wholeNumber(req, 'Upload-Length');
  if (size === 0) throw new AppError('unreadable', 'The file is empty. Choose another.');
  const pairs = (req.get('Upload-Metadata') ?? '').split(',').map((pair) => pair.trim().split(' '));
  const name = pairs.find(([key]) => key === 'filename')?.[1];
  if (!name) throw invalid([{ path: 'Upload-Metadata', message: 'Name the file: filename.' }]);
  return { name: Buffer.from(name, 'base64').toString('utf8'), size };
}

export function tellUpload(
  res: Response,
  { received, size, expiresAt }: { received: number; size: number; expiresAt: Date },
): void {
  res.setHeader('Upload-Offset', received);
  res.setHeader('Upload-Length', size);
  res.setHeader('Upload-Expires', expiresAt.toUTCString());
}

function wholeNumber(req: Request, header: string): number {
  const text = req.get(header) ?? '';
  if (!/^\d{1,12}$/.test(text))
    throw invalid([{ path: header, message: 'A whole number of bytes is needed.' }]);
  return Number(text);
}
