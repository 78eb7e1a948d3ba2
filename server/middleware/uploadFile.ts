import { AsyncResource } from 'node:async_hooks';
import type { Request, RequestHandler } from 'express';
import multer, { memoryStorage } from 'multer';
import { LIMITS } from '../../shared/limits';
import { invalid } from '../errors';
import { plainFileName } from '../services/files/plainFileName';

const takeFile = multer({
  storage: memoryStorage(),
  limits: {
    fileSize: LIMITS.upload.bytes,
    files: 1,
    fields: 10,
    fieldSize: 64 * 1024,
    parts: 12,
  },
}).single('file');

/**
 * Stands after `authorize`: a stranger's file is not even taken from the wire. What follows stays with its request: the form is read from events of the connection.
 */
export const uploadFile: RequestHandler = (req, res, next) =>
  takeFile(req, res, AsyncResource.bind(next));

/** The file of the form. Throws `invalid` where there is none. */
export function fileOf(req: Request): { name: string; bytes: Buffer } {
  if (!req.file) throw invalid([{ path: 'file', message: 'Choose a file.' }]);
  return { name: plainName(req.file.originalname), bytes: req.file.buffer };
}

/** The form sends its name as UTF-8 read as Latin-1. */
function plainName(sent: string): string {
  const utf8 = Buffer.from(sent, 'latin1').toString('utf8');
  return plainFileName(utf8.includes('\ufffd') ? sent : utf8);
}
