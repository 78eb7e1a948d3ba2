import { promisify } from 'node:util';
import { gunzip, gzip } from 'node:zlib';

const [pack, unpack] = [promisify(gzip), promisify(gunzip)];

/** A large JSON value for a LONGBLOB, and back. */
export const packJson = (value: unknown): Promise<Buffer> => pack(JSON.stringify(value));

export const unpackJson = async <T>(bytes: Buffer): Promise<T> =>
  JSON.parse((await unpack(bytes)).toString('utf8')) as T;
