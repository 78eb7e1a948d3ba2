import type { CaseFile } from '../../../shared/case/caseFile';
import { needsReference } from '../geometry/needsReference';
import type { RouteOptions } from '../routeOptions';
import { hasFastKernel } from './fastKernel';

/** Whether the fast kernel routes a case: unless asked otherwise, wherever the machine and the case allow it. */
export function runsFast(caseFile: CaseFile, { kernel }: Pick<RouteOptions, 'kernel'>): boolean {
  return kernel !== 'reference' && hasFastKernel() && !needsReference(caseFile);
}
