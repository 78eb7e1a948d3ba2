import { useMemo } from 'react';
import { valueAt } from '@/components/charts/geometry/interpolate';
import { useRunStructures } from '@/components/queries/runs';
import type { RunStructure } from '@/shared/runs/types';
import { REGIME_LABELS } from '@/shared/structures/structureWords';
import { regimeAt } from './regimeAt';

/** What stands in the river as it is at a moment, by id: how the water passes, and how deep a breach is. */
export function useStructuresAt(runId: number, structures: readonly RunStructure[], t: number) {
  const failing = useMemo(
    () => structures.flatMap(({ breach }, i) => (breach ? [i] : [])),
    [structures],
  );
  const series = useRunStructures(
    runId,
    failing.map((i) => i + 1),
  );
  const words = new Map<string, string>();
  for (const { id, regimes } of structures)
    words.set(id, REGIME_LABELS[regimeAt(regimes, t).regime]);
  const bottoms = new Map<string, number>();
  failing.forEach((at, k) => {
    const found = series[k];
    const { id, top } = structures[at];
    // Before it begins the dam stands to its crest.
    if (found?.breach && valueAt(found.times, found.breach.width, t) > 0)
      bottoms.set(id, valueAt(found.times, found.breach.bottom, t));
    else if (top !== null) bottoms.set(id, top);
  });
  return { words, bottoms };
}
