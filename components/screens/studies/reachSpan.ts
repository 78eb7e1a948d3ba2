import type { ReachRow } from '@/shared/reaches/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';

type Span = Pick<ReachRow, 'firstChainage' | 'lastChainage'>;

/** Results are computed between the first and the last section and nowhere else. */
export const isOutside = (chainage: number, reach: Span | null): boolean =>
  reach !== null && (chainage < reach.firstChainage || chainage > reach.lastChainage);

/** E.g. `0.00 to 21.40 km`. */
export const spanText = (reach: Span, system: UnitSystem): string =>
  `${formatQuantity(reach.firstChainage, 'chainage', system)} to ${formatWithUnit(reach.lastChainage, 'chainage', system)}`;
