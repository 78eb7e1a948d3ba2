import type { UnitSystem } from '../units/units';

/** Manning's n of natural and made channels, as published. */
export interface RoughnessRow {
  group: RoughnessGroup;
  description: string;
  min: number;
  /** null where the source gives a range alone. */
  normal: number | null;
  max: number;
}
export type RoughnessGroup =
  'Minor stream' | 'Mountain stream' | 'Flood plain' | 'Major stream' | 'Excavated' | 'Lined';

export const ROUGHNESS_SOURCE =
  'V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, table 5-6';

/** What a group is called in these units. Of a major stream the source says a top width at flood stage above 100 ft. */
export const groupWords = (group: RoughnessGroup, system: UnitSystem): string =>
  group === 'Major stream'
    ? `Major stream, top width above ${system === 'metric' ? '30 m' : '100 ft'}`
    : group;

/** Natural channels first: they are what is surveyed. */
export const ROUGHNESS_TABLE: readonly RoughnessRow[] = [
  {
    group: 'Minor stream',
    description: 'Clean, straight, full stage, no rifts or deep pools',
    min: 0.025,
    normal: 0.03,
    max: 0.033,
  },
  {
    group: 'Minor stream',
    description: 'Clean, straight, full stage, more stones and weeds',
    min: 0.03,
    normal: 0.035,
    max: 0.04,
  },
  {
    group: 'Minor stream',
    description: 'Clean, winding, some pools and shoals',
    min: 0.033,
    normal: 0.04,
    max: 0.045,
  },
  {
    group: 'Minor stream',
    description: 'Clean, winding, some pools and shoals, some weeds and stones',
    min: 0.035,
    normal: 0.045,
    max: 0.05,
  },
  {
    group: 'Minor stream',
    description:
      'Clean, winding, weeds and stones, lower stages, more ineffective slopes and sections',
    min: 0.04,
    normal: 0.048,
    max: 0.055,
  },
  {
    group: 'Minor stream',
    description: 'Clean, winding, some weeds and more stones',
    min: 0.045,
    normal: 0.05,
    max: 0.06,
  },
  {
    group: 'Minor stream',
    description: 'Sluggish reaches, weedy, deep pools',
    min: 0.05,
    normal: 0.07,
    max: 0.08,
  },
  {
    group: 'Minor stream',
    description: 'Very weedy, deep pools, heavy stand of timber and underbrush',
    min: 0.075,
    normal: 0.1,
    max: 0.15,
  },
  {
    group: 'Mountain stream',
    description: 'Gravels, cobbles, few boulders',
    min: 0.03,
    normal: 0.04,
    max: 0.05,
  },
  {
    group: 'Mountain stream',
    description: 'Cobbles with large boulders',
    min: 0.04,
    normal: 0.05,
    max: 0.07,
  },
  {
    group: 'Flood plain',
    description: 'Pasture, short grass',
    min: 0.025,
    normal: 0.03,
    max: 0.035,
  },
  { group: 'Flood plain', description: 'Pasture, high grass', min: 0.03, normal: 0.035, max: 0.05 },
  { group: 'Flood plain', description: 'Cultivated, no crop', min: 0.02, normal: 0.03, max: 0.04 },
  { group: 'Flood plain', description: 'Mature row crops', min: 0.025, normal: 0.035, max: 0.045 },
  { group: 'Flood plain', description: 'Mature field crops', min: 0.03, normal: 0.04, max: 0.05 },
  {
    group: 'Flood plain',
    description: 'Scattered brush, heavy weeds',
    min: 0.035,
    normal: 0.05,
    max: 0.07,
  },
  {
    group: 'Flood plain',
    description: 'Light brush and trees, winter',
    min: 0.035,
    normal: 0.05,
    max: 0.06,
  },
  {
    group: 'Flood plain',
    description: 'Light brush and trees, summer',
    min: 0.04,
    normal: 0.06,
    max: 0.08,
  },
  {
    group: 'Flood plain',
    description: 'Medium to dense brush, winter',
    min: 0.045,
    normal: 0.07,
    max: 0.11,
  },
  {
    group: 'Flood plain',
    description: 'Medium to dense brush, summer',
    min: 0.07,
    normal: 0.1,
    max: 0.16,
  },
  {
    group: 'Flood plain',
    description: 'Dense willows, summer, straight',
    min: 0.11,
    normal: 0.15,
    max: 0.2,
  },
  {
    group: 'Flood plain',
    description: 'Cleared land, stumps, no sprouts',
    min: 0.03,
    normal: 0.04,
    max: 0.05,
  },
  {
    group: 'Flood plain',
    description: 'Cleared land, stumps, heavy growth of sprouts',
    min: 0.05,
    normal: 0.06,
    max: 0.08,
  },
  {
    group: 'Flood plain',
    description: 'Heavy stand of timber, few down trees, flood below branches',
    min: 0.08,
    normal: 0.1,
    max: 0.12,
  },
  {
    group: 'Flood plain',
    description: 'Heavy stand of timber, few down trees, flood reaching branches',
    min: 0.1,
    normal: 0.12,
    max: 0.16,
  },
  {
    group: 'Major stream',
    description: 'Regular section, no boulders or brush',
    min: 0.025,
    normal: null,
    max: 0.06,
  },
  {
    group: 'Major stream',
    description: 'Irregular and rough section',
    min: 0.035,
    normal: null,
    max: 0.1,
  },
  {
    group: 'Excavated',
    description: 'Earth, straight, uniform, clean, recently completed',
    min: 0.016,
    normal: 0.018,
    max: 0.02,
  },
  {
    group: 'Excavated',
    description: 'Earth, straight, uniform, clean, after weathering',
    min: 0.018,
    normal: 0.022,
    max: 0.025,
  },
  {
    group: 'Excavated',
    description: 'Gravel, uniform section, clean',
    min: 0.022,
    normal: 0.025,
    max: 0.03,
  },
  {
    group: 'Excavated',
    description: 'Earth, straight, short grass, few weeds',
    min: 0.022,
    normal: 0.027,
    max: 0.033,
  },
  {
    group: 'Excavated',
    description: 'Earth, winding and sluggish, no vegetation',
    min: 0.023,
    normal: 0.025,
    max: 0.03,
  },
  {
    group: 'Excavated',
    description: 'Earth, winding, grass, some weeds',
    min: 0.025,
    normal: 0.03,
    max: 0.033,
  },
  {
    group: 'Excavated',
    description: 'Earth, winding, dense weeds, deep channel',
    min: 0.03,
    normal: 0.035,
    max: 0.04,
  },
  {
    group: 'Excavated',
    description: 'Earth bottom, rubble sides',
    min: 0.028,
    normal: 0.03,
    max: 0.035,
  },
  {
    group: 'Excavated',
    description: 'Dragline, no vegetation',
    min: 0.025,
    normal: 0.028,
    max: 0.033,
  },
  {
    group: 'Excavated',
    description: 'Dragline, light brush on banks',
    min: 0.035,
    normal: 0.05,
    max: 0.06,
  },
  {
    group: 'Excavated',
    description: 'Rock cut, smooth and uniform',
    min: 0.025,
    normal: 0.035,
    max: 0.04,
  },
  {
    group: 'Excavated',
    description: 'Rock cut, jagged and irregular',
    min: 0.035,
    normal: 0.04,
    max: 0.05,
  },
  {
    group: 'Excavated',
    description: 'Not maintained, dense weeds as high as flow',
    min: 0.05,
    normal: 0.08,
    max: 0.12,
  },
  {
    group: 'Excavated',
    description: 'Not maintained, clean bottom, brush on sides',
    min: 0.04,
    normal: 0.05,
    max: 0.08,
  },
  {
    group: 'Excavated',
    description: 'Not maintained, dense brush, high stage',
    min: 0.08,
    normal: 0.1,
    max: 0.14,
  },
  { group: 'Lined', description: 'Concrete, trowel finish', min: 0.011, normal: 0.013, max: 0.015 },
  { group: 'Lined', description: 'Concrete, float finish', min: 0.013, normal: 0.015, max: 0.016 },
  { group: 'Lined', description: 'Concrete, unfinished', min: 0.014, normal: 0.017, max: 0.02 },
  { group: 'Lined', description: 'Gunite, good section', min: 0.016, normal: 0.019, max: 0.023 },
  {
    group: 'Lined',
    description: 'Gravel bottom, formed-concrete sides',
    min: 0.017,
    normal: 0.02,
    max: 0.025,
  },
  {
    group: 'Lined',
    description: 'Gravel bottom, dry rubble or riprap sides',
    min: 0.023,
    normal: 0.033,
    max: 0.036,
  },
  { group: 'Lined', description: 'Masonry, cemented rubble', min: 0.017, normal: 0.025, max: 0.03 },
];

/** Least and largest value of the table: what lies outside of it deserves a second look. */
export const ROUGHNESS_RANGE = {
  min: Math.min(...ROUGHNESS_TABLE.map(({ min }) => min)),
  max: Math.max(...ROUGHNESS_TABLE.map(({ max }) => max)),
};
