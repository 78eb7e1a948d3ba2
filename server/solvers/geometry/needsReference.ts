import type { CaseFile } from '../../../shared/case/caseFile';

/** Whether sections of a case have parts that do not flow, or a momentum coefficient, which only the readable kernel knows. */
export function needsReference({ sections, numerics }: CaseFile): boolean {
  return (
    numerics.momentum === 'compound' ||
    sections.some(
      ({ storage, embankments }) =>
        (storage?.length ?? 0) > 0 || embankments?.left || embankments?.right,
    )
  );
}
