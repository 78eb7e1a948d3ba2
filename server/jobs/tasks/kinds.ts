import type { TaskSetKind } from '../../../shared/tasks/types';
import { calibrationKind } from './calibration/calibrationKind';
import { convergenceKind, ensembleKind, sensitivityKind } from './confidence/confidenceKinds';
import type { AnyTaskKind } from './taskKind';
import { verificationKind } from './verificationKind';

/** How each kind of set is computed. A new kind is one file beside this and one line here. */
export const TASK_KINDS: Partial<Record<TaskSetKind, AnyTaskKind>> = {
  convergence: convergenceKind,
  sensitivity: sensitivityKind,
  ensemble: ensembleKind,
  calibration: calibrationKind,
  verification: verificationKind,
};
