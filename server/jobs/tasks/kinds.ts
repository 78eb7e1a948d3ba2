import type { TaskSetKind } from '../../../shared/tasks/types';
import type { AnyTaskKind } from './taskKind';

/** How each kind of set is computed. A new kind is one file beside this and one line here. */
export const TASK_KINDS: Partial<Record<TaskSetKind, AnyTaskKind>> = {};
