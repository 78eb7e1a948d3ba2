import { isOutside, spanText } from '@/components/screens/studies/reachSpan';

const reach = { firstChainage: 0, lastChainage: 21_400 };

test('the ends belong to the reach; before there is one nothing lies outside', () => {
  expect([0, 10_600, 21_400].map((at) => isOutside(at, reach))).toEqual([false, false, false]);
  expect([-1, 21_400.1].map((at) => isOutside(at, reach))).toEqual([true, true]);
  expect(isOutside(99, null)).toBe(false);
});

test('the span is told in the study’s units', () => {
  expect(spanText(reach, 'metric')).toBe('0.00 to 21.40 km');
  expect(spanText({ firstChainage: 0, lastChainage: 3048 }, 'usCustomary')).toBe('0 to 10,000 ft');
});
