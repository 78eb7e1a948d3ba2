import { formatNumber } from './format';
import { fromSi, UNITS, type Quantity, type UnitSystem } from './units';

/** A number of a message, SI. */
export interface SaidQuantity {
  value: number;
  quantity: Quantity;
  /** Significant figures, where they matter more than decimals: volumes of any size. */
  figures?: number;
  /** Where the quantity's own decimals are not wanted; in every system. */
  decimals?: number;
}

/** What a message is put together from, in order. */
export type MessagePart = string | SaidQuantity;

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
  ...values: (string | number | SaidQuantity | readonly MessagePart[])[]
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
  digits: Pick<SaidQuantity, 'figures' | 'decimals'> = {},
): SaidQuantity => ({ value, quantity, ...digits });

/** The message as it is shown to a person in this system. */
export function sayIn(system: UnitSystem, { message, parts }: Said): string {
  // Metric studies read what the command line prints.
  return system === 'metric' || !parts ? message : write(parts, system);
}

const isParts = (value: SaidQuantity | readonly MessagePart[]): value is readonly MessagePart[] =>
  Array.isArray(value);

function joined(parts: MessagePart[]): Said {
  const message = write(parts, 'metric');
  return parts.some((part) => typeof part !== 'string') ? { message, parts } : { message };
}

const write = (parts: readonly MessagePart[], system: UnitSystem): string =>
  parts.map((part) => (typeof part === 'string' ? part : quantityText(part, system))).join('');

function quantityText(said: SaidQuantity, system: UnitSystem): string {
  // A sentence compares places with cell sizes and spacings: chainages are told in metres here, not kilometres.
  const inMetres = said.quantity === 'chainage' && system === 'metric';
  const { symbol, decimals } = inMetres
    ? { symbol: 'm', decimals: 0 }
    : UNITS[system][said.quantity];
  const value = inMetres ? said.value : fromSi(said.value, said.quantity, system);
  if (said.figures === undefined) {
    return `${formatNumber(value, said.decimals ?? decimals)} ${symbol}`;
  }
  const rounded = Number(value.toPrecision(said.figures));
  const above = rounded === 0 ? 0 : Math.floor(Math.log10(Math.abs(rounded)));
  return `${formatNumber(rounded, Math.min(9, Math.max(0, said.figures - 1 - above)))} ${symbol}`;
}
