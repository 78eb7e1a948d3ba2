import { floodSentence, hazardTone, nearestStation } from '@/components/screens/issued/issuedWords';
import type { IssuedStation } from '@/shared/review/types';

const H = 3600;
const station = (change: Partial<IssuedStation> = {}): IssuedStation => ({
  stationId: 1,
  name: 'Sallow Mill',
  chainage: 13100,
  times: [0, 48 * H],
  stage: [36, 36],
  depth: [0.5, 0.5],
  flow: [50, 50],
  peakStage: 40.71,
  peakStageTime: 18.2 * H,
  peakFlow: 441,
  peakFlowTime: 18 * H,
  arrival: 7 * H + 11 * 60,
  withinBanksAgain: 34 * H,
  leavesBanks: true,
  hazard: null,
  levels: [],
  ...change,
});
const said = (of: IssuedStation, startsAt: string | null = null) =>
  floodSentence(of, startsAt)
    .map(({ text }) => text)
    .join('')
    .replaceAll('\u00a0', ' ');

test('the flood in a sentence, its times standing out', () => {
  expect(said(station())).toBe(
    'The water starts to rise after 7 h 11, stands highest at 18 h 12, and is back within the banks after 34 h 00.',
  );
  const strong = floodSentence(station(), null).filter((part) => part.strong);
  expect(strong).toHaveLength(3);
});

test('a place that the flood does not reach, or that stays wet, is not told otherwise', () => {
  expect(said(station({ arrival: null, leavesBanks: false, withinBanksAgain: null }))).toBe(
    'The flood hardly raises the water here; it stands highest at 18 h 12, and stays within the banks.',
  );
  expect(said(station({ withinBanksAgain: null }))).toMatch(
    /and is still out of the banks when the computation ends\.$/,
  );
});

test('where the flood has a date, the clock stands beside the hours', () => {
  expect(said(station(), '2025-11-14T06:00:00Z')).toContain('after 7 h 11 (14 Nov, 13:11)');
});

test('classes dangerous to people are said in the tone of danger', () => {
  expect(['H1', 'H2', 'H3', 'H6'].map(hazardTone)).toEqual([
    'info',
    'attention',
    'danger',
    'danger',
  ]);
});

test('a place from the address leads to the nearest station', () => {
  const stations = [station(), station({ stationId: 2, chainage: 17400 })];
  expect(nearestStation(stations, null)?.stationId).toBe(1);
  expect(nearestStation(stations, 16000)?.stationId).toBe(2);
  expect(nearestStation([], 3)).toBeUndefined();
});
