import type { CaseFile, Downstream } from '../../../shared/case/caseFile';
import { q, say, type Said } from '../../../shared/units/message';

/** How far a given level is raised, m. */
const RAISED = 0.5;
/** What becomes of the slope at the outlet: water leaves more slowly and stands higher. */
const SLOPE_SHARE = 0.5;
/** Instead of a free outlet. */
const MILD_SLOPE = 0.0005;

/** What is changed at the outlet to see how far it reaches, in words; null where the end is closed. */
export function describeOutletChange(downstream: Downstream): Said | null {
  switch (downstream.kind) {
    case 'normalDepth':
      return say`half of the slope at the outlet`;
    case 'stage':
    case 'rating':
      return say`the stage at the outlet ${q(RAISED, 'depth')} higher`;
    case 'criticalDepth':
    case 'open':
      return say`normal depth at a slope of ${MILD_SLOPE} at the outlet`;
    case 'wall':
      return null;
  }
}

/** The same case with that change; null where the end is closed. Pure. */
export function changeOutlet(caseFile: CaseFile): CaseFile | null {
  const changed = changedEnd(caseFile.downstream);
  return (
    changed && { ...caseFile, title: `${caseFile.title}, outlet changed`, downstream: changed }
  );
}

function changedEnd(end: Downstream): Downstream | null {
  const raised = (stages: number[]) => stages.map((stage) => stage + RAISED);
  switch (end.kind) {
    case 'normalDepth':
      return { ...end, slope: end.slope * SLOPE_SHARE };
    case 'stage':
    case 'rating':
      return { ...end, stages: raised(end.stages) };
    case 'criticalDepth':
    case 'open':
      return { kind: 'normalDepth', slope: MILD_SLOPE };
    case 'wall':
      return null;
  }
}
