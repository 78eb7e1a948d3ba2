import type { Models } from '../../models';

/** Where the reaches of a study begin and end, m; null before the first. */
export async function reachSpan({ Reach }: Models, studyId: number) {
  const reaches = await Reach.findAll({ where: { studyId } });
  if (reaches.length === 0) return null;
  return {
    from: Math.min(...reaches.map(({ firstChainage }) => firstChainage)),
    to: Math.max(...reaches.map(({ lastChainage }) => lastChainage)),
  };
}
