import { arrivalRule } from '../../../shared/runs/arrivalRule';
import type { CaseFile } from '../../../shared/case/caseFile';
import { checkLaterals } from '../../../shared/case/validate/boundaryFaults';
import { Faults, faultsIn } from '../../../shared/case/validate/faults';
import { checkReservoir } from '../../../shared/case/validate/reservoirFaults';
import { memberLabel } from '../../../shared/confidence/memberLabel';
import { PLANS } from '../../../shared/confidence/planMembers';
import type { SensitivitySettings } from '../../../shared/confidence/schemas';
import { partsOf, q, say, sayAll, sayIn, typed, unitOf } from '../../../shared/units/message';
import { RunFailed } from '../../../server/solvers/runErrors';

// 1 ft is 0.3048 m exactly (NIST SP 811, app. B.8): 3.048 m are 10 ft, 28.316846592 m³ are 1000 ft³.
const rises = say`The bed rises ${q(3.048, 'depth')} over ${q(1234.44, 'chainage')} in ${3} places.`;

test('a message is SI text and the same numbers in feet', () => {
  expect(rises.message).toBe('The bed rises 3.05 m over 1,234 m in 3 places.');
  expect(sayIn('metric', rises)).toBe(rises.message);
  expect(sayIn('usCustomary', rises)).toBe('The bed rises 10.00 ft over 4,050 ft in 3 places.');
});

test('digits asked for hold in both systems', () => {
  const volume = say`${q(28.316846592, 'volume', { figures: 3 })}`;
  expect(volume.message).toBe('28.3 m³');
  expect(sayIn('usCustomary', volume)).toBe('1,000 ft³');
  expect(say`${q(0.000123456, 'volume', { figures: 3 })}`.message).toBe('0.000123 m³');
  expect(say`${q(0, 'volume', { figures: 3 })}`.message).toBe('0.00 m³');
  const place = say`${q(507, 'chainage', { decimals: 2 })}`;
  expect(place.message).toBe('507.00 m');
  expect(sayIn('usCustomary', place)).toBe('1,663.39 ft');
});

test('what was stored as plain text stays as it is in every system', () => {
  const old = { message: 'Water rose by 0.42 m at XS-03.' };
  expect(sayIn('usCustomary', old)).toBe(old.message);
  expect(sayIn('metric', old)).toBe(old.message);
  expect(say`${'XS-01'} has no bank marks.`).toEqual({ message: 'XS-01 has no bank marks.' });
});

test('messages are put together of messages, and survive being stored as JSON', () => {
  const both = sayAll([{ message: 'Look again.' }, rises]);
  const stored = JSON.parse(JSON.stringify(say`${partsOf(both)} So it is.`)) as typeof both;
  expect(sayIn('usCustomary', stored)).toBe(
    'Look again. The bed rises 10.00 ft over 4,050 ft in 3 places. So it is.',
  );
});

test('the arrival rule of a run of any age is told in feet', () => {
  const rule = arrivalRule({ text: 'As it was stored, 0.1 m.', rise: 0.1, depth: 0.1 });
  expect(sayIn('metric', rule)).toBe('As it was stored, 0.1 m.');
  expect(sayIn('usCustomary', rule)).toMatch(/is 0\.33 ft above .* water is 0\.33 ft deep/);
});

test('what was typed comes back with all its digits, and nothing of the way through metres', () => {
  // 12.345 ft are 3.762756 m: 1 ft is 0.3048 m exactly (NIST SP 811, app. B.8).
  const fault = say`is ${typed(3.762756, 'length')}; a width in ${unitOf('length')}, ${typed(1000, 'chainage')}`;
  expect(fault.message).toBe('is 3.762756 m; a width in m, 1000 m');
  expect(sayIn('usCustomary', fault)).toBe('is 12.345 ft; a width in ft, 3280.8399 ft');
});

test('why a run failed is told in feet', () => {
  const { message, said } = new RunFailed(say`Rose ${q(3.048, 'depth')}.`, 5, 30.48);
  expect(message).toBe('The run failed at chainage 30.5 m at 5.0 s: Rose 3.05 m.');
  expect(sayIn('usCustomary', said)).toBe(
    'The run failed at chainage 100.0 ft at 5.0 s: Rose 10.00 ft.',
  );
});

test('faults of a case file and of the parts of a section are told in feet', () => {
  const faults = new Faults();
  checkLaterals(faults, [{ from: 914.4, to: 10, times: [0], flows: [1] }], [0, 304.8]);
  checkReservoir(faults, 'upstream', {
    kind: 'reservoir',
    stages: [3.048, 6.096],
    volumes: [5, -28.316846592],
    initialStage: 304.8,
    inflow: { times: [0], flows: ['x'] },
  });
  const told = faultsIn('usCustomary', faults.list).map(({ message }) => message);
  expect(told).toEqual([
    'chainage 3000 ft lies outside the reach, 0 ft to 1000 ft',
    'is -1000 ft³; it cannot be negative',
    'is -1000 ft³, not above the value before it; it must rise',
    '1000 ft lies outside the stages of the storage table; extend it',
    'must be one of the flows in ft³/s as a finite number, not the text "x"',
  ]);
});

test('a member of a set is named in feet', () => {
  const settings = {
    cellSize: null,
    parameters: [
      { key: 'roughness', low: 0.8, high: 1.2 },
      { key: 'outletStage', low: -0.3048, high: 0.3048 },
    ],
  };
  const set = { kind: 'sensitivity', settings };
  const labels = PLANS.sensitivity(settings as SensitivitySettings, {} as CaseFile).map(
    ({ label }, position) => memberLabel(set, { position, label }, 'usCustomary'),
  );
  expect(labels).toEqual([
    'Base case',
    "Manning's n −20 %",
    "Manning's n +20 %",
    'Stage at the outlet −1.00 ft',
    'Stage at the outlet +1.00 ft',
  ]);
});
