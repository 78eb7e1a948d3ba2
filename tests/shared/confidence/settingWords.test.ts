import { valueWords } from '../../../shared/confidence/planMembers';
import { distributionWords, settingFacts } from '../../../shared/confidence/settingWords';

// 0.3048 m is 1 ft exactly (NIST SP 811, app. B.8).
test('a shift is told in the unit of the study, a factor has none', () => {
  expect(valueWords('outletStage', -0.3048, 'metric')).toBe('−0.30 m');
  expect(valueWords('outletStage', -0.3048, 'usCustomary')).toBe('−1.00 ft');
  expect(valueWords('roughness', 1.2, 'usCustomary')).toBe('+20 %');
  const spread = { kind: 'triangular', low: -0.6096, mode: 0, high: 0.3048 } as const;
  expect(distributionWords('outletStage', spread, 'usCustomary')).toBe(
    'triangular, lowest −2.00 ft, most likely 0.00 ft, highest 1.00 ft',
  );
  expect(distributionWords('outletSlope', spread, 'usCustomary')).toContain('lowest -0.61');
});

test('what was chosen for a sensitivity is told in feet', () => {
  const settings = {
    cellSize: 30.48,
    parameters: [{ key: 'outletStage', low: -0.3048, high: 0.3048 }],
  };
  expect(settingFacts({ kind: 'sensitivity', settings }, 'usCustomary')).toEqual([
    ['Stage at the outlet', '−1.00 ft and +1.00 ft'],
    ['Cells', '100 ft, chosen for the members'],
  ]);
});
