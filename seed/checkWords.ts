/** What the invented people of the demo write while they check. */
export const NOTE = {
  method:
    'One-dimensional routing of the design flood on the November survey, with cells of the proposed size and normal depth at the outlet.',
  assumptions:
    'Bed and banks do not move. Roughness as assigned from the walk along the reach in November. No water beside the main inflow.',
  limits:
    'Good between the first and the last surveyed section. Levels on the floodplain behind embankments may differ, and debris at the bridge is not in it.',
};

export const ANSWERS: Record<string, string> = {
  purpose:
    'Yes: peak levels and times at Tornick bridge, Sallow Mill and the gauge at Ebbick for the 1 in 100 year flood are what was asked.',
  hydrology:
    'Peak and shape are those of the catchment flood study; base flow as gauged at Ebbick in November.',
  calibration:
    'There are no flood marks on this reach. Roughness is from the reference table and photographs; the levels carry that doubt.',
  leftOut:
    'The decks of the two footbridges are left out; they stand above the computed peak. Side storage behind the railway bank is left out, on the safe side.',
  outletInfluence:
    'The last station lies more than two kilometres above the outlet, and the reach falls enough that the backwater of the outlet ends below it.',
  gridSize:
    'The proposed cell size puts several cells between any two sections; a second size is to follow before the final design.',
  surveyAdvice: 'Looked through note by note; none lies within a section of the places asked for.',
  warnings: 'Read; they lie away from the stations and do not move the peaks there.',
  sectionEnds: 'The valley side goes on rising beyond the surveyed end; the added depth is small.',
  other: 'Looked at; it does not move the peaks at the stations.',
};

export const SETTLED_POINT = {
  chainage: 10_600,
  time: null,
  text: 'The stage at Tornick bridge comes close to the soffit. Was the contraction at the bridge surveyed, or taken from the next section?',
  answer: 'Surveyed: the section at the bridge is the opening itself, measured at low water.',
  closing: 'Seen in the survey. Settled.',
};

export const OPEN_POINT = {
  chainage: 13_100,
  time: null,
  text: 'With a fifth more water the mill is reached earlier than the flood study says. Which of the two do we stand behind, and why?',
};
