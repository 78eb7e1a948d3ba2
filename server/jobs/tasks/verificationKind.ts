import type { VerificationResult } from '../../../shared/verificationCases/types';
import { publishedCase, runPublishedCase } from '../../verificationCases';
import { taskKind } from './taskKind';

export interface VerificationPayload {
  caseId: string;
}

/** A member is a published case on all its grids. */
export const verificationKind = taskKind<null, VerificationPayload, VerificationResult>({
  compute({ caseId }, _input, control) {
    const published = publishedCase(caseId);
    if (!published) throw new Error('This version of the product has no such case.');
    return runPublishedCase(published, control);
  },
});
