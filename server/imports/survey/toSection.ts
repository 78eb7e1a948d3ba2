import type { Section } from '../../../shared/surveys/types';
import { METRES_PER } from '../headings/lengthUnits';
import { bankMarksOf } from './bankMarks';
import type { RawSection } from './rawTypes';

/** A section without faults, in SI. Elevations and offsets keep the digits of the file to a tenth of a millimetre. */
export function toSection(raw: RawSection): Section {
  const perOffset = METRES_PER[raw.fields.get('offset')!.unit];
  const perElevation = METRES_PER[raw.fields.get('elevation')!.unit];
  const points = raw.points.map(({ offset, elevation }): [number, number] => [
    tidy((offset as number) * perOffset),
    tidy((elevation as number) * perElevation),
  ]);
  const marks = bankMarksOf(raw);
  return {
    id: raw.id,
    chainage: tidy(raw.chainage!),
    points,
    roughness: roughnessOf(raw, points),
    banks: marks.length === 2 ? [points[marks[0].index][0], points[marks[1].index][0]] : null,
    coordinates: coordinatesOf(raw),
  };
}

/** Takes away the noise of the conversion (12.34 ft · 0.3048) and nothing else. */
const tidy = (value: number) => Math.round(value * 1e4) / 1e4;

/** Each value holds from its point on; the first one given holds from the left end. None given: none. */
function roughnessOf(raw: RawSection, points: [number, number][]): [number, number][] {
  const zones: [number, number][] = [];
  raw.points.forEach(({ roughness }, index) => {
    if (typeof roughness !== 'number') return;
    const from = zones.length === 0 ? points[0][0] : points[index][0];
    if (zones.length > 0 && zones.at(-1)![1] === roughness) return;
    if (zones.length > 0 && zones.at(-1)![0] === from) zones.at(-1)![1] = roughness;
    else zones.push([from, roughness]);
  });
  return zones;
}

function coordinatesOf(raw: RawSection): [number, number][] | null {
  const [easting, northing] = [raw.fields.get('easting'), raw.fields.get('northing')];
  if (!easting || !northing) return null;
  if (raw.points.some((point) => point.easting === null || point.northing === null)) return null;
  return raw.points.map((point) => [
    tidy((point.easting as number) * METRES_PER[easting.unit]),
    tidy((point.northing as number) * METRES_PER[northing.unit]),
  ]);
}
