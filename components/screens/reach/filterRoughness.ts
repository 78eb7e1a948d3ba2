/** Rows whose group or description holds every word typed; without words all. */
export function filterRoughness<R extends { group: string; description: string }>(
  rows: readonly R[],
  typed: string,
): R[] {
  const words = typed.toLowerCase().split(/\s+/).filter(Boolean);
  return rows.filter(({ group, description }) => {
    const text = `${group} ${description}`.toLowerCase();
    return words.every((word) => text.includes(word));
  });
}
