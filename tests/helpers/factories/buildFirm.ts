import type { Services } from '../../../server/composition';
import type { FirmModel } from '../../../server/models/Firm';
import { nextNumber } from './counter';

export const buildFirm = (
  { models }: Services,
  given: { name?: string } = {},
): Promise<FirmModel> => models.Firm.create({ name: `Firm ${nextNumber()}`, ...given });
