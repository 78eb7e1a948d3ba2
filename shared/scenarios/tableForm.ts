import { object, string, type InferType } from 'yup';
import { UNIT_SYSTEMS } from '../units/units';

/** The fields beside the file of `POST /api/tables/read`. */
export const tableFormSchema = object({
  quantity: string().oneOf(['flow', 'stage']).required(),
  unitSystem: string().oneOf(UNIT_SYSTEMS).required(),
}).noUnknown();

export type TableForm = InferType<typeof tableFormSchema>;
