/** The section nearest to a place; sections by chainage. null where there are none. */
export function nearestSection<S extends { chainage: number }>(
  sections: readonly S[],
  chainage: number,
): S | null {
  let nearest: S | null = null;
  for (const section of sections)
    if (
      nearest === null ||
      Math.abs(section.chainage - chainage) < Math.abs(nearest.chainage - chainage)
    )
      nearest = section;
  return nearest;
}
