import { taskKind } from '../taskKind';
import { computeMember } from './computeMember';
import { gatherConvergence } from './gatherConvergence';
import { gatherEnsemble } from './gatherEnsemble';
import { gatherSensitivity } from './gatherSensitivity';

/** One way to compute a member, three to look at them. */
export const convergenceKind = taskKind({ compute: computeMember, gather: gatherConvergence });
export const sensitivityKind = taskKind({ compute: computeMember, gather: gatherSensitivity });
export const ensembleKind = taskKind({ compute: computeMember, gather: gatherEnsemble });
