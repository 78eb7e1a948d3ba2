import type { StructureInput } from '../../../shared/case/structures';
import { factsOfStructure } from '../../../shared/comparison/structureFacts';
import { formatWithUnit } from '../../../shared/units/format';
import type { UnitSystem } from '../../../shared/units/units';

const told = (structure: StructureInput, system: UnitSystem) =>
  factsOfStructure(structure, (value, quantity) => formatWithUnit(value, quantity, system)).map(
    ({ what, text }) => `${what}: ${text}`,
  );

test('a structure is told field by field in the units of the study', () => {
  const dam: StructureInput = {
    kind: 'breach',
    id: 'Dam',
    chainage: 304.8,
    note: 'Not compared.',
    crest: [
      [0, 30.48],
      [60.96, 33.528],
    ],
    trigger: { kind: 'stage', stage: 30.48 },
    mode: 'piping',
    growth: 'linear',
    formationTime: 5400,
    bottomWidth: 15.24,
    bottomLevel: 24.384,
    sideSlope: 0.7,
    startLevel: 27.432,
    weirCoefficient: 1.7,
  };
  // 1 ft is 0.3048 m exactly (NIST SP 811, app. B.8); 1.7 m½/s are 1.7 / √0.3048 = 3.08 ft½/s.
  expect(told(dam, 'usCustomary')).toEqual([
    'kind: breach',
    'chainage: 1,000 ft',
    'crest: 2 points, 100.00 ft to 110.00 ft',
    'trigger: stage 100.00 ft',
    'mode: piping',
    'growth: linear',
    'formation time: 1 h 30',
    'bottom width: 50.0 ft',
    'bottom level: 80.00 ft',
    'side slope: 0.7',
    'start level: 90.00 ft',
    'weir coefficient: 3.08 ft½/s',
  ]);
  const gate: StructureInput = {
    kind: 'sluice',
    id: 'Gate',
    chainage: 10,
    width: 5,
    sill: 12,
    times: [0, 3600],
    openings: [0, 1.5],
  };
  expect(told(gate, 'metric')).toContain('openings: 2 values, 0.00 m to 1.50 m');
  expect(told(gate, 'metric')).toContain('times: 2 values, 0 h 00 to 1 h 00');
});
