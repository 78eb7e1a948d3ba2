import type { UnitSystem } from '@/shared/units/units';

export const UNIT_SYSTEM_NAMES: Record<UnitSystem, string> = {
  metric: 'Metric (m, m³/s)',
  usCustomary: 'US customary (ft, ft³/s)',
};
