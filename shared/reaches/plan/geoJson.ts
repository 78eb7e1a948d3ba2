/** Of GeoJSON (RFC 7946) what a plan needs. Positions are [easting, northing] in the study's own coordinate system. */
export type Position = [number, number];

export type PlanGeometry =
  { type: 'LineString'; coordinates: Position[] } | { type: 'Polygon'; coordinates: Position[][] };

export interface PlanFeature {
  type: 'Feature';
  geometry: PlanGeometry;
  properties: Record<string, string | number | boolean | null>;
}

/**
 * RFC 7946 positions are WGS 84 longitude and latitude. Surveys are not: their coordinates are given as they are, and what
 * they refer to is named in the foreign member `coordinateSystem` (RFC 7946, section 6.1), which a reader must be told.
 */
export interface PlanCollection {
  type: 'FeatureCollection';
  coordinateSystem: string;
  notes: string[];
  features: PlanFeature[];
}
