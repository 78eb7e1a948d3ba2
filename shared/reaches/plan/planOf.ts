import type { Section } from '../../surveys/types';
import { lowestIndex, thalwegOf } from '../sectionGeometry';
import { floodExtent } from './floodExtent';
import type { PlanCollection, PlanFeature } from './geoJson';

const AXES =
  'Positions are easting and northing in the coordinate system named here, not longitude and latitude of WGS 84.';
const DRAWN =
  'The peak extent is computed at the sections. Between them it is drawn by straight lines, not computed: no flood map, and no ground for decisions on safety.';

/** Sections and centre line of a reach, and the peak extent of a run where one is given, as GeoJSON. */
export function planOf(
  sections: readonly Section[],
  coordinateSystem: string,
  run?: { number: number; peakStages: ReadonlyMap<string, number> },
): PlanCollection {
  const placed = sections.filter(({ coordinates }) => coordinates);
  const extent = run ? floodExtent(sections, run.peakStages) : { features: [], crossing: [] };
  const missing = sections.length - placed.length;
  return {
    type: 'FeatureCollection',
    coordinateSystem,
    notes: [
      AXES,
      ...(run ? [`Run ${run.number}. ${DRAWN}`] : []),
      ...(missing > 0
        ? [
            `Without coordinates and left out: ${missing === 1 ? '1 section' : `${missing} sections`}.`,
          ]
        : []),
      ...(extent.crossing.length > 0
        ? [`Section lines cross, so no extent is drawn between ${extent.crossing.join(', ')}.`]
        : []),
    ],
    features: [...centreLine(placed), ...placed.map(sectionLine), ...extent.features],
  };
}

/** Through the lowest points of the sections. */
function centreLine(placed: readonly Section[]): PlanFeature[] {
  if (placed.length < 2) return [];
  return [
    {
      type: 'Feature',
      geometry: {
        type: 'LineString',
        coordinates: placed.map((section) => section.coordinates![lowestIndex(section)]),
      },
      properties: { kind: 'centreLine', through: 'lowest points of the sections' },
    },
  ];
}

const sectionLine = (section: Section): PlanFeature => ({
  type: 'Feature',
  geometry: { type: 'LineString', coordinates: section.coordinates! },
  properties: {
    kind: 'section',
    id: section.id,
    chainage: section.chainage,
    lowestPoint: thalwegOf(section),
  },
});
