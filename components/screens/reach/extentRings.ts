import type { PlanCollection, Position } from '@/shared/reaches/plan/geoJson';

/** Outer rings of the widest water of a run, as the server joined its edges. */
export const extentRings = (plan: PlanCollection | undefined): Position[][] =>
  (plan?.features ?? []).flatMap(({ geometry }) =>
    geometry.type === 'Polygon' ? [geometry.coordinates[0]] : [],
  );
