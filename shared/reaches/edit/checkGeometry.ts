import { LIMITS } from '../../limits';
import type { Section } from '../../surveys/types';

/** What is wrong with a section, at a path within it: `points[3][0]`, `banks[1]`, `storage[0].to`. */
export interface GeometryFault {
  sectionId: string;
  path: string;
  message: string;
}

const FARTHEST = 1e6;
const LEAST_POINTS = 3;
const MAX_NAME = 100;

/** All that keeps a geometry from being stored: what a survey file would be refused for, and what the modeller adds to it. */
export function checkGeometry(sections: readonly Section[]): GeometryFault[] {
  const faults = sections.flatMap(checkSection);
  if (sections.length < 2)
    faults.push({
      sectionId: sections[0]?.id ?? '',
      path: '',
      message: 'A reach needs two sections or more.',
    });
  const seen = new Map<string, number>();
  sections.forEach(({ id }) => seen.set(id, (seen.get(id) ?? 0) + 1));
  for (const [id, count] of seen)
    if (count > 1)
      faults.push({
        sectionId: id,
        path: 'id',
        message: `${count} sections are called ${id}. Each has a name of its own.`,
      });
  const byPlace = [...sections].sort((a, b) => a.chainage - b.chainage);
  byPlace.forEach((section, i) => {
    if (i > 0 && section.chainage === byPlace[i - 1].chainage)
      faults.push({
        sectionId: section.id,
        path: 'chainage',
        message: `It stands at the chainage of ${byPlace[i - 1].id}. Each has one of its own.`,
      });
  });
  return faults;
}

/** The faults of one section by itself. */
export function checkSection(section: Section): GeometryFault[] {
  const faults: GeometryFault[] = [];
  const at = (path: string, message: string) =>
    faults.push({ sectionId: section.id, path, message });
  if (section.id.trim() === '') at('id', 'Name the section.');
  if (section.id.length > MAX_NAME) at('id', `At most ${MAX_NAME} characters.`);
  if (!isPlace(section.chainage)) at('chainage', 'Give the chainage as a number.');
  checkPoints(section, at);
  if (faults.length > 0) return faults;
  checkBanks(section, at);
  checkRoughness(section, at);
  checkStorage(section, at);
  checkEmbankments(section, at);
  return faults;
}

type At = (path: string, message: string) => void;
const isPlace = (value: number) => Number.isFinite(value) && Math.abs(value) <= FARTHEST;
const endsOf = ({ points }: Section) => [points[0][0], points[points.length - 1][0]] as const;
const SPAN = 'within the section';

function checkPoints({ points, coordinates }: Section, at: At): void {
  if (points.length < LEAST_POINTS) {
    at('points', `A section needs ${LEAST_POINTS} points or more: both banks and the bed.`);
    return;
  }
  if (points.length > LIMITS.upload.pointsPerSection)
    at('points', `At most ${LIMITS.upload.pointsPerSection} points a section. Thin it out.`);
  points.forEach(([y, z], i) => {
    if (!isPlace(y)) at(`points[${i}][0]`, 'Give the offset as a number.');
    else if (i > 0 && y < points[i - 1][0])
      at(`points[${i}][0]`, 'It lies left of the point before. Points run from left to right.');
    if (!isPlace(z)) at(`points[${i}][1]`, 'Give the elevation as a number.');
  });
  const last = points.length - 1;
  if (points[last][0] <= points[0][0]) at('points', 'The section has no width.');
  if (points[1][0] === points[0][0] && points[1][1] > points[0][1])
    at('points[0][1]', 'The wall at the left end falls outwards. Begin at its top.');
  if (points[last][0] === points[last - 1][0] && points[last - 1][1] > points[last][1])
    at(`points[${last}][1]`, 'The wall at the right end falls outwards. End at its top.');
  if (coordinates && coordinates.length !== points.length)
    at('coordinates', 'Every point has a coordinate, or none has.');
}

function checkBanks(section: Section, at: At): void {
  if (!section.banks) return;
  const [first, last] = endsOf(section);
  const [left, right] = section.banks;
  if (!(left >= first)) at('banks[0]', `The left bank mark is not ${SPAN}.`);
  if (!(right <= last)) at('banks[1]', `The right bank mark is not ${SPAN}.`);
  if (!(left < right)) at('banks[1]', 'The right bank stands to the right of the left one.');
}

function checkRoughness(section: Section, at: At): void {
  const [first, last] = endsOf(section);
  section.roughness.forEach(([from, n], i) => {
    if (!isPlace(from) || (i > 0 && from <= section.roughness[i - 1][0]))
      at(`roughness[${i}][0]`, 'Each roughness zone begins to the right of the one before.');
    if (i === 0 && from > first)
      at('roughness[0][0]', 'Roughness begins at the left end of the section.');
    if (from >= last) at(`roughness[${i}][0]`, 'The zone begins beyond the right end.');
    if (!(n >= 0 && n <= 1)) at(`roughness[${i}][1]`, "Manning's n lies between 0 and 1.");
  });
}

function checkStorage(section: Section, at: At): void {
  const [first, last] = endsOf(section);
  const parts = section.storage ?? [];
  parts.forEach(({ from, to, flowsAbove }, i) => {
    if (!(from >= first && from <= last)) at(`storage[${i}].from`, `It does not begin ${SPAN}.`);
    if (!(to >= first && to <= last)) at(`storage[${i}].to`, `It does not end ${SPAN}.`);
    if (!(from < to)) at(`storage[${i}].to`, 'It ends to the right of where it begins.');
    if (i > 0 && from < parts[i - 1].to)
      at(`storage[${i}].from`, 'It begins before the part to its left ends.');
    if (flowsAbove !== undefined && !isPlace(flowsAbove))
      at(`storage[${i}].flowsAbove`, 'Give the level as a number.');
  });
  if (parts.length > 0 && parts[0].from <= first && parts.length === 1 && parts[0].to >= last)
    at('storage[0].to', 'The whole section would hold water without carrying any.');
}

function checkEmbankments(section: Section, at: At): void {
  const { left, right } = section.embankments ?? {};
  const [first, last] = endsOf(section);
  for (const [side, it] of [['left', left] as const, ['right', right] as const]) {
    if (!it) continue;
    if (!(it.offset > first && it.offset < last))
      at(`embankments.${side}.offset`, 'An embankment stands between the ends of the section.');
    if (!isPlace(it.crest)) at(`embankments.${side}.crest`, 'Give the crest as a number.');
  }
  if (left && right && left.offset >= right.offset)
    at('embankments.right.offset', 'The right embankment stands to the right of the left one.');
}
