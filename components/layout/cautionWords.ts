/** What everybody who reads a result must know of it. */
export const CAUTIONS = [
  'A computed flood, not a forecast and not a warning: nothing here watches a river or raises an alarm.',
  'Water is routed along the reach in one dimension: one level and one mean velocity a cross-section. Flow across floodplains, erosion and deposition, debris, ice, wind and blocked structures are not represented.',
  'Decisions about flood and dam safety need a licensed engineer and the rules of the local authority.',
] as const;
