import type { BreachTrigger, CrestPoint, StructureInput } from '../case/structures';
import { formatDuration } from '../units/format';
import type { Quantity } from '../units/units';
import type { CaseFact, Say } from './caseFacts';

/** Fields with a unit; those that are left out are shares, coefficients and words. */
const QUANTITIES: Record<string, Quantity> = {
  chainage: 'chainage',
  sill: 'elevation',
  soffit: 'elevation',
  invertUp: 'elevation',
  invertDown: 'elevation',
  bottomLevel: 'elevation',
  startLevel: 'elevation',
  width: 'length',
  height: 'length',
  diameter: 'length',
  length: 'length',
  bottomWidth: 'length',
  centre: 'length',
  weirCoefficient: 'weirCoefficient',
};

/** Field by field, so that a changed crest or opening shows. */
export const factsOfStructure = (structure: StructureInput, say: Say): CaseFact[] =>
  Object.entries(structure)
    .filter(([key]) => key !== 'id' && key !== 'note')
    .map(([key, value]: [string, unknown]) => ({
      part: `Structure ${structure.id}`,
      what: spoken(key),
      text: textOf(key, value, say),
      exact: value,
    }));

function textOf(key: string, value: unknown, say: Say): string {
  if (typeof value === 'number') {
    if (key === 'formationTime') return formatDuration(value);
    return QUANTITIES[key] ? say(value, QUANTITIES[key]) : String(value);
  }
  if (typeof value === 'string') return spoken(value);
  if (key === 'crest' || key === 'deck') return crestText(value as CrestPoint[], say);
  if (key === 'trigger') return triggerText(value as BreachTrigger, say);
  const values = value as number[];
  const ends = [Math.min(...values), Math.max(...values)];
  const range = key === 'times' ? ends.map(formatDuration) : ends.map((end) => say(end, 'depth'));
  return `${values.length} values, ${range.join(' to ')}`;
}

function crestText(points: CrestPoint[], say: Say): string {
  const levels = points.map(([, level]) => level);
  return `${points.length} points, ${say(Math.min(...levels), 'elevation')} to ${say(Math.max(...levels), 'elevation')}`;
}

const triggerText = (trigger: BreachTrigger, say: Say): string =>
  trigger.kind === 'time'
    ? `after ${formatDuration(trigger.time)}`
    : `stage ${say(trigger.stage, 'elevation')}`;

/** `crestWidth` as `crest width`. */
const spoken = (key: string) => key.replaceAll(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
