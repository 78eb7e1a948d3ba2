import { object, string, type InferType } from 'yup';
import { TASK_SET_KINDS } from './types';

/** `GET /api/studies/:studyId/task-sets`. */
export const taskSetsQuerySchema = object({
  kind: string().oneOf(TASK_SET_KINDS).optional(),
}).noUnknown();

export type TaskSetsQuery = InferType<typeof taskSetsQuerySchema>;
