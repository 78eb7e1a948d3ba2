import type { MarkConfidence, MarkKind } from './types';

const KINDS: [MarkKind, RegExp][] = [
  ['gaugePeak', /gauge|gage|recorder|crest/i],
  ['debris', /debris|wrack|seed|drift|trash/i],
  ['stain', /stain|mud|silt|wet|paint/i],
  ['eyewitness', /eye|witness|photo|video|report|told/i],
  ['other', /other|unknown/i],
];

/** What was seen, from a word of the table; an empty one is `other`, null where the word says nothing known. */
export function readKind(text: string): MarkKind | null {
  if (text.trim() === '') return 'other';
  return KINDS.find(([, words]) => words.test(text))?.[0] ?? null;
}

const CONFIDENCES: [MarkConfidence, RegExp][] = [
  ['poor', /^(poor|p|low|bad|uncertain|3)$/i],
  ['fair', /^(fair|f|medium|middle|2)$/i],
  ['good', /^(good|g|high|excellent|sure|1)$/i],
];

/** An empty word is `fair`. */
export function readConfidence(text: string): MarkConfidence | null {
  if (text.trim() === '') return 'fair';
  return CONFIDENCES.find(([, words]) => words.test(text.trim()))?.[0] ?? null;
}

/** A day as `2024-01-09`; null for an empty cell, undefined where it cannot be read. Days stand before months. */
export function readDay(text: string): string | null | undefined {
  const word = text.trim();
  if (word === '') return null;
  const iso = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})(?:[T\s].*)?$/.exec(word);
  const usual = /^(\d{1,2})[-/.](\d{1,2})[-/.](\d{4})(?:\s.*)?$/.exec(word);
  const found = iso ?? usual;
  if (!found) return undefined;
  const [a, b, c] = [found[1], found[2], found[3]].map(Number);
  const [year, month, day] = iso ? [a, b, c] : [c, b, a];
  const at = new Date(Date.UTC(year, month - 1, day));
  if (at.getUTCMonth() !== month - 1 || at.getUTCDate() !== day) return undefined;
  return at.toISOString().slice(0, 10);
}
