import { arrivalRule } from '../../../shared/runs/arrivalRule';
import { partsOf, q, say, sayAll, sayIn } from '../../../shared/units/message';

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
