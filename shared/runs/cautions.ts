/** Stand wherever a result can be read or printed. */
export const CAUTIONS = [
  'A computed flood, not a forecast and not a warning: nothing here watches a river or raises an alarm.',
  'Water is routed along the reach in one dimension: one level and one mean velocity a cross-section. Flow across floodplains, erosion and deposition, debris, ice, wind and blocked structures are not represented.',
  'The result is as good as the survey, the roughness and the inflow that went in. Compare it with observed levels before it is relied on.',
  'Decisions about flood and dam safety need a licensed engineer and the rules of the local authority.',
] as const;
