import type { Section } from '../../surveys/types';
import { isSame } from './geometryChange';

/** Sections named by one clause; more are counted. */
const NAMED = 4;

/** What differs from one geometry to the next, in words for the history. */
export function describeChange(before: readonly Section[], after: readonly Section[]): string {
  const old = new Map(before.map((section) => [section.id, section]));
  const now = new Map(after.map((section) => [section.id, section]));
  const added = after.filter(({ id }) => !old.has(id));
  const removed = before.filter(({ id }) => !now.has(id));
  const renamed = removed.flatMap((gone) => {
    const same = added.find((made) => isSame({ ...gone, id: made.id }, made));
    return same ? [{ gone, same }] : [];
  });
  const clauses = new Map<string, string[]>();
  const say = (what: string, id: string) => {
    const ids = clauses.get(what);
    if (ids) ids.push(id);
    else clauses.set(what, [id]);
  };
  renamed.forEach(({ gone, same }) => say('renamed', `${gone.id} to ${same.id}`));
  added
    .filter((made) => !renamed.some(({ same }) => same === made))
    .forEach(({ id }) => say('added', id));
  removed
    .filter((lost) => !renamed.some(({ gone }) => gone === lost))
    .forEach(({ id }) => say('removed', id));
  for (const section of after) {
    const was = old.get(section.id);
    if (was) changesOf(was, section).forEach((what) => say(what, section.id));
  }
  if (clauses.size === 0) return 'Nothing changed';
  return [...clauses].map(([what, ids]) => `${named(ids)}: ${what}`).join('; ');
}

/** What differs in one section. */
export function changesOf(was: Section, now: Section): string[] {
  if (isSame(was, now)) return [];
  const differs = (key: keyof Section) =>
    JSON.stringify(was[key] ?? null) !== JSON.stringify(now[key] ?? null);
  return [
    differs('chainage') && 'chainage',
    differs('points') && 'points',
    differs('banks') && 'bank marks',
    differs('roughness') && 'roughness',
    differs('storage') && 'storage parts',
    differs('embankments') && 'embankments',
    !differs('points') && differs('coordinates') && 'coordinates',
  ].filter((word): word is string => word !== false);
}

function named(ids: string[]): string {
  const rest = ids.length > NAMED ? ` and ${ids.length - NAMED} more` : '';
  return `${ids.slice(0, NAMED).join(', ')}${rest}`;
}
