/** Stand wherever a result can be read or printed. */
export const CAUTIONS = [
  'One-dimensional: one water level across each cross-section, flow along the reach only. Flow across floodplains, at bends and around buildings is not resolved.',
  'Not represented: moving bed, debris and ice, blockage of bridges and culverts, wind, seepage, and air in the water.',
  'The result is as good as the survey, the roughness and the inflow that went in. Compare it with observed levels before it is relied on.',
  'Decisions on flood and dam safety need a licensed engineer and the rules of the local authority. This is not a warning system.',
] as const;
