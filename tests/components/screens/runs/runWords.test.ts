import {
  attenuationFigure,
  attenuationWords,
  percent,
  runStateWords,
  timeLeftWords,
  tookWords,
} from '@/components/screens/runs/runWords';

test('a run is never said to be done before it is', () => {
  expect(percent(0.3479)).toBe('34 %');
  expect(percent(0.9999)).toBe('99 %');
  expect(percent(1)).toBe('99 %');
  expect(percent(-0.1)).toBe('0 %');
  expect(runStateWords({ state: 'running', progress: 0.5 })).toBe('Running, 50 %');
  expect(runStateWords({ state: 'failed', progress: 0.5 })).toBe('Stopped with a fault');
});

test.each([
  [null, 'time left not known yet'],
  [3, 'a few seconds left'],
  [42, 'about 40 s left'],
  [250, 'about 4 min left'],
  [7200, 'about 2.0 h left'],
])('%p s left: %s', (seconds, words) => expect(timeLeftWords(seconds)).toBe(words));

test('computing time', () => {
  expect(tookWords(6.34)).toBe('6.3 s');
  expect(tookWords(12.34)).toBe('12 s');
  expect(tookWords(125)).toBe('2 min 05 s');
});

test('attenuation tells which way', () => {
  expect(attenuationWords(0.08)).toBe('8 % less than in');
  expect(attenuationWords(-0.03)).toBe('3 % more than in');
  expect(attenuationWords(0.001)).toBe('as much as in');
  expect(attenuationWords(null)).toBeNull();
  expect(attenuationFigure({ attenuation: null })).toBe('–');
  expect(attenuationFigure({ attenuation: -0.03 })).toBe('−3');
});
