import type { NumericsSettings } from '@/shared/scenarios/schemas';

/** `428 cells, 577 times kept`: what the settings mean for a reach; null while a number is missing. */
export function runSize(
  { cellSize, duration, outputInterval }: NumericsSettings,
  { firstChainage, lastChainage }: { firstChainage: number; lastChainage: number },
): string | null {
  if (!isAbove(cellSize) || !isAbove(duration) || !isAbove(outputInterval)) return null;
  const cells = Math.max(1, Math.round((lastChainage - firstChainage) / cellSize));
  const moments = Math.ceil(duration / outputInterval) + 1;
  const counted = (count: number) => count.toLocaleString('en-GB');
  return `${counted(cells)} cells, ${counted(moments)} times kept.`;
}

const isAbove = (value: number | null): value is number => value !== null && value > 0;
