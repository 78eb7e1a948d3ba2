import type { Station } from './types';

/** Where the stations of today are not those of another day. */
export interface StationDifference {
  /** As it was. */
  name: string;
  what: 'added' | 'gone' | 'renamed' | 'moved' | 'levels';
}

/** What would be read differently at the stations of today; in the order of those that were. */
export function stationDifferences(
  were: readonly Station[],
  today: readonly Station[],
): StationDifference[] {
  const now = new Map(today.map((station) => [station.id, station]));
  const known = new Set(were.map(({ id }) => id));
  const changed = were.flatMap(({ id, name, chainage, levels }): StationDifference[] => {
    const other = now.get(id);
    if (!other) return [{ name, what: 'gone' }];
    if (other.chainage !== chainage) return [{ name, what: 'moved' }];
    if (levelsText(other.levels) !== levelsText(levels)) return [{ name, what: 'levels' }];
    return other.name === name ? [] : [{ name, what: 'renamed' }];
  });
  const added = today.filter(({ id }) => !known.has(id));
  return [...changed, ...added.map(({ name }): StationDifference => ({ name, what: 'added' }))];
}

const levelsText = (levels: Station['levels']): string =>
  JSON.stringify((levels ?? []).map(({ kind, level, note }) => [kind, level, note]));
