import type { StationBody, StudyBody } from '../shared/studies/schemas';

export const VESHALL: StudyBody = {
  title: 'Lower Veshall at Tornick',
  clientName: 'Tornick Town Council',
  place: 'Tornick',
  verticalDatum: 'Veshall levelling datum 1974',
  coordinateSystem: 'Veshall valley grid, metres',
  unitSystem: 'metric',
  purpose:
    'Flood levels and times at Tornick bridge, Sallow Mill and the gauge at Ebbick for the 1 in 100 year flood.',
};
export const VESHALL_STATIONS: StationBody[] = [
  {
    name: 'Tornick bridge',
    chainage: 10_600,
    levels: [
      { kind: 'soffit', level: 41.6, note: 'Middle arch' },
      { kind: 'road', level: 42.9, note: '' },
    ],
  },
  {
    name: 'Sallow Mill',
    chainage: 13_100,
    levels: [{ kind: 'floor', level: 38.3, note: 'Miller’s house' }],
  },
  { name: 'Gauge at Ebbick', chainage: 17_400 },
];
