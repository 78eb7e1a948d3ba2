import type { Href } from 'expo-router';

/** Where to go after signing in: only an address of our own, so that no link can lead a person off. */
export function safeNext(next: string | undefined): Href {
  const isOurs = next !== undefined && /^\/(?![/\\])/.test(next);
  return (isOurs ? next : '/') as Href;
}
