import { METRES_PER_FOOT, METRES_PER_US_SURVEY_FOOT } from '../../../shared/units/units';
import type { LengthUnit } from '../../../shared/surveys/types';

export const METRES_PER: Record<LengthUnit, number> = {
  m: 1,
  km: 1000,
  ft: METRES_PER_FOOT,
  usft: METRES_PER_US_SURVEY_FOOT,
};
export const UNIT_SYMBOLS: Record<LengthUnit, string> = {
  m: 'm',
  km: 'km',
  ft: 'ft',
  usft: 'US ft',
};

const SPELLINGS = new Map<string, LengthUnit>([
  ...spell('m', 'm metre metres meter meters metres metro metros maod mahd masl mnn mngf msnm'),
  ...spell('km', 'km kilometre kilometres kilometer kilometers kilometro kilometros'),
  ...spell('ft', 'ft feet foot pie pies pied pieds intft'),
  ...spell(
    'usft',
    'usft ftus ussft sft usfeet ussurveyft ussurveyfeet ussurveyfoot surveyft surveyfeet',
  ),
]);
/** Units that headings do name but that surveys are not read in: better refused than read as metres. */
const FOREIGN = new Set(['mm', 'cm', 'dm', 'in', 'inch', 'inches', 'yd', 'yards', 'mi', 'miles']);

function spell(unit: LengthUnit, words: string): [string, LengthUnit][] {
  return words.split(' ').map((word) => [word, unit]);
}

const letters = (text: string) =>
  text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z]/g, '');

/** The unit that a word names; null where it names none. */
export function unitOf(text: string): LengthUnit | null {
  const word = letters(text);
  const known = SPELLINGS.get(word);
  if (known) return known;
  // A datum may follow the unit: `m AOD`, `ft NAVD88`, `m ü. NN`.
  const first = /^\s*([a-z]+)[\s.]/i.exec(text)?.[1];
  return first ? (SPELLINGS.get(letters(first)) ?? null) : null;
}

export const isForeignUnit = (text: string) => FOREIGN.has(letters(text));

export const inUnit = (value: number, from: LengthUnit, to: LengthUnit) =>
  from === to ? value : (value * METRES_PER[from]) / METRES_PER[to];
