import type { SurveyField } from '../../../shared/surveys/types';
import { HEADING_WORDS } from './headingWords';
import { readHeading, type Heading } from './readHeading';

export interface HeadingMatch extends Heading {
  column: number;
  text: string;
  field: SurveyField | null;
}

/**
 * What a row of headings means. Names that mean different things in different company are settled by the others:
 * `station` is the offset where no other offset is named and else the chainage; `x` and `y` are coordinates where both
 * stand, and `x` or `y` alone is the offset where no other is named; `n` is a northing beside an easting, and else Manning's n.
 */
export function matchHeadings(row: { column: number; text: string }[]): HeadingMatch[] {
  const matches = row.map(({ column, text }): HeadingMatch => {
    const heading = readHeading(text);
    return { column, text, ...heading, field: HEADING_WORDS.get(heading.words) ?? null };
  });
  const has = (field: SurveyField) => matches.some((match) => match.field === field);
  const named = (words: string) =>
    matches.filter((match) => match.words === words && match.field === null);

  const [xs, ys] = [named('x'), named('y')];
  if (xs.length && ys.length && !has('easting') && !has('northing')) {
    assign(xs[0], 'easting');
    assign(ys[0], 'northing');
  } else if (!has('offset')) assign(xs[0] ?? ys[0], 'offset');

  const e = named('e')[0];
  if (e && !has('easting')) assign(e, 'easting');
  const ns = named('n');
  if (has('easting') && !has('northing'))
    assign(ns.find(({ text }) => text.trim().startsWith('N')) ?? ns[0], 'northing');
  if (!has('roughness'))
    assign(
      ns.find(({ field }) => field === null),
      'roughness',
    );

  const station = named('station')[0] ?? named('sta')[0];
  if (!has('offset')) assign(station, 'offset');
  else if (!has('chainage')) assign(station, 'chainage');
  return matches;
}

function assign(match: HeadingMatch | undefined, field: SurveyField) {
  if (match) match.field = field;
}
