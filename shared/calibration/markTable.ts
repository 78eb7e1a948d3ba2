import { METRES_PER_FOOT, METRES_PER_US_SURVEY_FOOT } from '../units/units';

/** Columns of a table of marks, in the order they have without a heading row. */
export const MARK_COLUMNS = [
  'chainage',
  'level',
  'kind',
  'confidence',
  'note',
  'flood',
  'day',
] as const;
export type MarkColumn = (typeof MARK_COLUMNS)[number];

interface Line {
  /** 1-based, as in the text or the sheet. */
  line: number;
  cells: string[];
}

/** Filled lines cut into cells. A cell in double quotes may hold the separator. */
export function splitTable(text: string): Line[] {
  const lines = text
    .split(/\r\n|\n|\r/)
    .map((content, i) => ({ line: i + 1, content }))
    .filter(({ content }) => content.replace(/[\t;,\s]/g, '') !== '');
  const share = (sign: string) => lines.filter(({ content }) => content.includes(sign)).length;
  const most = lines.length / 2;
  const separator = share('\t') > most ? '\t' : share(';') > most ? ';' : ',';
  return lines.map(({ line, content }) => ({ line, cells: cut(content, separator) }));
}

function cut(content: string, separator: string): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (let i = 0; i < content.length; i++) {
    const sign = content[i];
    if (sign === '"' && quoted && content[i + 1] === '"') {
      cell += '"';
      i++;
    } else if (sign === '"' && (quoted || cell.trim() === '')) quoted = !quoted;
    else if (sign === separator && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += sign;
  }
  return [...cells, cell.trim()];
}

const WORDS: [MarkColumn, RegExp][] = [
  ['chainage', /chainage|station|distance|^km\b|^x\b/i],
  ['confidence', /confidence|quality|rating|certain|sure/i],
  ['kind', /kind|type|what/i],
  ['flood', /flood|event/i],
  ['day', /day|date|when|observed|surveyed|seen/i],
  ['note', /note|remark|comment|place|where/i],
  ['level', /level|stage|elevation|water|height|^z\b|^h\b/i],
];

const UNIT_WORDS: [RegExp, { name: string; si: number }][] = [
  [/[([\s,_]km\b|^km\b/i, { name: 'km', si: 1000 }],
  [
    /[([\s,_](usft|us ft|ftus|us survey feet)\b/i,
    { name: 'US survey ft', si: METRES_PER_US_SURVEY_FOOT },
  ],
  [/[([\s,_](ft|feet)\b/i, { name: 'ft', si: METRES_PER_FOOT }],
  [/[([\s,_](m|metres?|meters?)\b/i, { name: 'm', si: 1 }],
];
const unitIn = (text: string) => UNIT_WORDS.find(([word]) => word.test(text))?.[1] ?? null;

/** Where each column stands, told by its heading; null where the first row is a mark already. */
export function headingOf(cells: string[]) {
  if (cells.slice(0, 2).some((cell) => /^[-+−]?[\d.,]*\d/.test(cell))) return null;
  const places: [MarkColumn, number][] = [];
  const units: Partial<Record<MarkColumn, { name: string; si: number } | null>> = {};
  cells.forEach((cell, i) => {
    const found = WORDS.find(
      ([name, words]) => words.test(cell) && !places.some(([taken]) => taken === name),
    );
    if (!found) return;
    places.push([found[0], i]);
    units[found[0]] = unitIn(cell);
  });
  return {
    places: places as readonly (readonly [MarkColumn, number])[],
    chainageUnit: units.chainage ?? null,
    levelUnit: units.level ?? null,
  };
}
