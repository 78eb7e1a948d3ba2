import type { Fault } from '../../../shared/errors';
import type { SectionsChangeBody } from '../../../shared/reaches/schemas';
import type { Section } from '../../../shared/surveys/types';
import { formatQuantity } from '../../../shared/units/format';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { invalid } from '../../errors';

/** Sections named in one fault; more are counted. */
const NAMED = 3;

/** The sections with the change made. Pure. Throws `invalid` with everything that does not fit, told in the study's units; then nothing is changed. */
export function changeSections(
  sections: Section[],
  body: SectionsChangeBody,
  system: UnitSystem,
): Section[] {
  const chosen = new Set(body.sectionIds);
  const known = new Set(sections.map(({ id }) => id));
  const strangers = body.sectionIds.filter((id) => !known.has(id));
  const faults: Fault[] = [];
  if (strangers.length > 0)
    faults.push({ path: 'sectionIds', message: `No such section: ${named(strangers)}.` });
  if (body.roughness && body.roughnessByBank)
    faults.push({ path: 'roughness', message: 'Set roughness by offset or by bank, not both.' });
  const changed = sections
    .filter(({ id }) => chosen.has(id))
    .map((section) => withBanks(section, body));
  faults.push(...bankFaults(changed, body, system), ...zoneFaults(changed, body));
  if (faults.length > 0) throw invalid(faults);
  const byId = new Map(changed.map((section) => [section.id, withRoughness(section, body)]));
  return sections.map((section) => byId.get(section.id) ?? section);
}

const withBanks = (section: Section, { banks }: SectionsChangeBody): Section =>
  banks === undefined ? section : { ...section, banks: banks ? [banks[0], banks[1]] : null };

function withRoughness(
  section: Section,
  { roughness, roughnessByBank }: SectionsChangeBody,
): Section {
  const start = section.points[0][0];
  if (roughness)
    return {
      ...section,
      roughness: roughness.map(([from, n], i) => [i === 0 ? Math.min(from, start) : from, n]),
    };
  if (!roughnessByBank) return section;
  const { left, channel, right } = roughnessByBank;
  const [leftBank, rightBank] = section.banks ?? [start, start];
  const zones: [number, number][] = [
    [start, left],
    [leftBank, channel],
    [rightBank, right],
  ];
  // A bank at the section's end leaves no zone outside of it.
  const last = section.points[section.points.length - 1][0];
  return {
    ...section,
    roughness: section.banks
      ? zones.filter(([from], i) => from < last && (i === 2 || from < zones[i + 1][0]))
      : [[start, channel]],
  };
}

function bankFaults(
  sections: Section[],
  { banks }: SectionsChangeBody,
  system: UnitSystem,
): Fault[] {
  if (!banks) return [];
  if (banks[0] >= banks[1])
    return [{ path: 'banks[1]', message: 'The right bank stands to the right of the left one.' }];
  const outside = sections.filter(
    ({ points }) => banks[0] < points[0][0] || banks[1] > points[points.length - 1][0],
  );
  if (outside.length === 0) return [];
  const [{ points }] = outside;
  const ends = [points[0][0], points[points.length - 1][0]].map((offset) =>
    formatQuantity(offset, 'length', system),
  );
  const range = `${ends.join(' to ')} ${UNITS[system].length.symbol}`;
  return [
    {
      path: 'banks[0]',
      message: `These banks lie outside of ${named(outside.map(({ id }) => id))}${outside.length === 1 ? `, which runs from ${range}` : ''}.`,
    },
  ];
}

function zoneFaults(
  sections: Section[],
  { roughness, roughnessByBank }: SectionsChangeBody,
): Fault[] {
  const faults: Fault[] = [];
  roughness?.forEach(([from], i) => {
    if (i > 0 && from <= roughness[i - 1][0])
      faults.push({
        path: `roughness[${i}][0]`,
        message: 'Each zone begins to the right of the one before.',
      });
    const beyond = sections.filter(({ points }) => from >= points[points.length - 1][0]);
    if (beyond.length > 0)
      faults.push({
        path: `roughness[${i}][0]`,
        message: `It begins beyond the right end of ${named(beyond.map(({ id }) => id))}.`,
      });
  });
  const bare = sections.filter(({ banks }) => !banks).map(({ id }) => id);
  if (roughnessByBank && bare.length > 0) {
    const { left, channel, right } = roughnessByBank;
    if (left !== channel || right !== channel)
      faults.push({
        path: 'roughnessByBank',
        message: `${named(bare)} ${bare.length === 1 ? 'has' : 'have'} no bank marks. Set them first, or one value throughout.`,
      });
  }
  return faults;
}

function named(ids: string[]): string {
  const rest = ids.length > NAMED ? ` and ${ids.length - NAMED} more` : '';
  return `${ids.slice(0, NAMED).join(', ')}${rest}`;
}
