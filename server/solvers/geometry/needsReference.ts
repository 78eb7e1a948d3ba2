import type { CaseFile } from '../../../shared/case/caseFile';

/** Whether sections of a case have parts that do not flow, or a momentum coefficient: partTable.ts. */
export function hasParts({ sections, numerics }: CaseFile): boolean {
  return (
    numerics.momentum === 'compound' ||
    sections.some(
      ({ storage, embankments }) =>
        (storage?.length ?? 0) > 0 || embankments?.left || embankments?.right,
    )
  );
}

/** Whether a case has terms that only the readable kernel knows. */
export function needsReference(caseFile: CaseFile): boolean {
  return hasParts(caseFile) || (caseFile.localLosses?.length ?? 0) > 0;
}
