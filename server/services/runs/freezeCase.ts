import { createHash } from 'node:crypto';
import { promisify } from 'node:util';
import { gunzip, gzip } from 'node:zlib';
import { canonical } from '../../../shared/case/canonical';
import type { CaseFile } from '../../../shared/case/caseFile';

const zip = promisify(gzip);
const unzip = promisify(gunzip);

/** A case as it is kept with its run: gzip of its canonical JSON, and the hash of that text. */
export async function freezeCase(caseFile: CaseFile) {
  const text = canonical(caseFile);
  return {
    caseBytes: await zip(text),
    caseHash: `sha256:${createHash('sha256').update(text).digest('hex')}`,
  };
}

/** The canonical JSON, to the byte: its SHA-256 is the hash of the run. */
export const thawCase = (caseBytes: Buffer): Promise<Buffer> => unzip(caseBytes);
