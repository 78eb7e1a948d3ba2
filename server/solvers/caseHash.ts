import { createHash } from 'node:crypto';

import { canonical } from '../../shared/case/canonical';
import type { CaseFile } from '../../shared/case/caseFile';

/** "sha256:…" of the canonical text of a case. */
export function caseHash(caseFile: CaseFile): string {
  return `sha256:${createHash('sha256').update(canonical(caseFile)).digest('hex')}`;
}
