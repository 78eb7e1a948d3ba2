import type { SearchStretch } from '@/shared/calibration/search/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';

export const PART_WORDS: Record<SearchStretch['part'], string> = {
  all: 'Whole section',
  channel: 'Channel, between the banks',
  overbank: 'Flood plain, outside the banks',
};

/** `Flood plain`, or what it is where nobody named it. */
export const stretchName = ({ name, part }: SearchStretch): string =>
  name || PART_WORDS[part].split(',')[0];

export const stretchPlace = ({ from, to }: SearchStretch, system: UnitSystem): string =>
  `${formatQuantity(from, 'chainage', system)} to ${formatWithUnit(to, 'chainage', system)}`;
