import type { LengthUnit } from '../../../shared/surveys/types';
import { isForeignUnit, unitOf } from './lengthUnits';

export interface Heading {
  /** Lower case, without accents, punctuation and unit. */
  words: string;
  unit: LengthUnit | null;
  /** A unit that surveys are not read in, as it was written; else null. */
  foreignUnit: string | null;
}

/** Parts a heading like `Dist. from left bank [ft]`, `Elev, m AOD` or `offset_m` into its words and its unit. */
export function readHeading(text: string): Heading {
  const plain = text.normalize('NFKD').replace(/\p{M}/gu, '').trim();
  const bracket = /[([{]([^)\]}]*)[)\]}]/.exec(plain);
  if (bracket) {
    const inside = bracket[1].trim();
    const rest = wordsOf(plain.replace(bracket[0], ' '));
    if (unitOf(inside)) return { words: rest, unit: unitOf(inside), foreignUnit: null };
    if (isForeignUnit(inside)) return { words: rest, unit: null, foreignUnit: inside };
    return { words: rest || wordsOf(inside), unit: null, foreignUnit: null };
  }
  const tail =
    /^(.*?)(?:\s*[,/:]\s*|[\s_]+in[\s_]+|[\s_]+)(us[\s_]*(?:survey[\s_]*)?f(?:ee)?t|[a-z]+(?:\s*[.a-z0-9 ]*)?)$/i.exec(
      plain,
    );
  const unit = tail ? unitOf(tail[2].replaceAll('_', '')) : null;
  if (tail && unit && wordsOf(tail[1])) return { words: wordsOf(tail[1]), unit, foreignUnit: null };
  return { words: wordsOf(plain), unit: null, foreignUnit: null };
}

const wordsOf = (text: string) =>
  text
    .toLowerCase()
    .replace(/['’`]/g, '')
    .replace(/[^a-z0-9]+/g, ' ')
    .trim();
