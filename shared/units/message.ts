import { formatNumber } from './format';
import { UNITS, type Quantity, type Unit, type UnitSystem } from './units';

/** A number of a message, SI. */
export interface SaidQuantity {
  value: number;
  quantity: Quantity;
  /** Significant figures, where they matter more than decimals: volumes of any size. */
  figures?: number;
  /** Where the quantity's own decimals are not wanted; in every system. */
  decimals?: number;
  /** All the digits there are: a value that somebody typed and looks for again. */
  exact?: boolean;
}

/** The symbol of a unit by itself: a length "in m". */
export interface SaidUnit {
  unit: Quantity;
}

/** What a message is put together from, in order. */
export type MessagePart = string | SaidQuantity | SaidUnit;

/** A sentence whose numbers can be told in the study's units. */
export interface Said {
  /** In SI, as the command line prints it. */
  message: string;
  /** Left out where the message has no quantities, and in what was stored before there were any. */
  parts?: MessagePart[];
}

/** Tag of a template: ``say`The bed rises ${q(0.4, 'depth')}.` ``; words and plain numbers go in as they are. */
export function say(
  words: TemplateStringsArray,
  ...values: (string | number | SaidQuantity | SaidUnit | readonly MessagePart[])[]
): Said {
  const parts = words.flatMap((text, i): MessagePart[] => {
    const value = values[i];
    if (value === undefined) return [text];
    if (typeof value === 'object') return [text, ...(isParts(value) ? value : [value])];
    return [text, String(value)];
  });
  return joined(parts);
}

/** Sentences behind each other as one. */
export const sayAll = (said: readonly Said[], between = ' '): Said =>
  joined(said.flatMap((one, i) => (i > 0 ? [between, ...partsOf(one)] : partsOf(one))));

/** Parts of a message; one without any is a single word. */
export const partsOf = ({ message, parts }: Said): MessagePart[] => parts ?? [message];

/** A quantity for `say`. */
export const q = (
  value: number,
  quantity: Quantity,
  digits: Pick<SaidQuantity, 'figures' | 'decimals' | 'exact'> = {},
): SaidQuantity => ({ value, quantity, ...digits });

/** A value as it was typed, with all its digits. */
export const typed = (value: number, quantity: Quantity): SaidQuantity =>
  q(value, quantity, { exact: true });

/** A unit's symbol for `say`. */
export const unitOf = (unit: Quantity): SaidUnit => ({ unit });

/** What is plain text already, or a message, as a message. */
export const asSaid = (words: string | Said): Said =>
  typeof words === 'string' ? { message: words } : words;

/** The message as it is shown to a person in this system. */
export function sayIn(system: UnitSystem, { message, parts }: Said): string {
  // Metric studies read what the command line prints.
  return system === 'metric' || !parts ? message : write(parts, system);
}

const isParts = (value: MessagePart | readonly MessagePart[]): value is readonly MessagePart[] =>
  Array.isArray(value);

function joined(parts: MessagePart[]): Said {
  const message = write(parts, 'metric');
  return parts.some((part) => typeof part !== 'string') ? { message, parts } : { message };
}

const write = (parts: readonly MessagePart[], system: UnitSystem): string =>
  parts.map((part) => (typeof part === 'string' ? part : partText(part, system))).join('');

const partText = (part: SaidQuantity | SaidUnit, system: UnitSystem): string =>
  'unit' in part ? unitIn(part.unit, system).symbol : quantityText(part, system);

/** A sentence compares places with cell sizes and spacings: chainages are told in metres here, not kilometres. */
const unitIn = (quantity: Quantity, system: UnitSystem): Unit =>
  quantity === 'chainage' && system === 'metric'
    ? { symbol: 'm', si: 1, decimals: 0 }
    : UNITS[system][quantity];

function quantityText(said: SaidQuantity, system: UnitSystem): string {
  const { symbol, si, decimals } = unitIn(said.quantity, system);
  const value = said.value / si;
  // Nine figures: what was typed in feet comes back without the rounding of its way through metres.
  if (said.exact) return `${si === 1 ? value : Number(value.toPrecision(9))} ${symbol}`;
  if (said.figures === undefined) {
    return `${formatNumber(value, said.decimals ?? decimals)} ${symbol}`;
  }
  const rounded = Number(value.toPrecision(said.figures));
  const above = rounded === 0 ? 0 : Math.floor(Math.log10(Math.abs(rounded)));
  return `${formatNumber(rounded, Math.min(9, Math.max(0, said.figures - 1 - above)))} ${symbol}`;
}
