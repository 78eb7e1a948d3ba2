/** The paths of what stands in `given` and no more in `known`, which a schema made of it, as yup writes them: `a.b[2].c` */
export function unknownPaths(given: unknown, known: unknown, path = ''): string[] {
  if (Array.isArray(given)) {
    if (!Array.isArray(known)) return [];
    return given.flatMap((item, i) => unknownPaths(item, known[i], `${path}[${i}]`));
  }
  if (!isRecord(given) || !isRecord(known)) return [];
  return Object.entries(given).flatMap(([key, value]) => {
    const place = path ? `${path}.${key}` : key;
    return key in known ? unknownPaths(value, known[key], place) : [place];
  });
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
