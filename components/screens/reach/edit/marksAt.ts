import type { Section } from '@/shared/surveys/types';

/** What stands on an offset of a section, in words. */
export function marksAt(
  { banks, roughness, storage = [], embankments = {} }: Section,
  offset: number,
): string[] {
  const zone = roughness.findIndex(([from]) => from === offset);
  return [
    banks?.[0] === offset && 'left bank',
    banks?.[1] === offset && 'right bank',
    zone > 0 && `n ${roughness[zone][1]} from here`,
    storage.some(({ from }) => from === offset) && 'storage begins',
    storage.some(({ to }) => to === offset) && 'storage ends',
    embankments.left?.offset === offset && 'left embankment',
    embankments.right?.offset === offset && 'right embankment',
  ].filter((word): word is string => typeof word === 'string');
}
