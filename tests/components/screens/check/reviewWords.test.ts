import { pointSteps } from '@/components/screens/check/pointSteps';
import {
  ageWords,
  checkLabel,
  outcomeBadge,
  pointPlace,
  runBadge,
  sortPoints,
  unanswered,
} from '@/components/screens/check/reviewWords';
import type { ChecklistItem, ReviewPoint } from '@/shared/review/types';

test('a routed run is told apart by the state of its checking, any other by its own', () => {
  const run = { state: 'routed', progress: 1, review: null } as const;
  expect(runBadge(run)).toEqual({ label: 'Routed, unsigned', tone: 'ochre' });
  expect(runBadge({ ...run, review: 'inCheck' }).label).toBe('In check');
  expect(runBadge({ ...run, review: 'issued' })).toEqual({ label: 'Issued', tone: 'moss' });
  expect(runBadge({ ...run, review: 'withdrawn' })).toEqual({ label: 'Withdrawn', tone: 'brick' });
  expect(runBadge({ state: 'running', progress: 0.5, review: null }).label).toBe('Running, 50 %');
});

test('the results name what comes next for who looks at them', () => {
  expect(checkLabel(null, ['modeller'])).toBe('Send for checking');
  expect(checkLabel(null, ['seniorEngineer'])).toBe('Open the check');
  expect(checkLabel('inCheck', ['seniorEngineer'])).toBe('Check this run');
  expect(checkLabel('inCheck', ['modeller'])).toBe('Open the check');
  expect(checkLabel('returned', ['modeller'])).toBe('Mend and send again');
  expect(checkLabel('signed', ['modeller'])).toBe('Issue to the client');
  expect(checkLabel('withdrawn', ['modeller'])).toBe('Open the check');
});

test('what was asked, and what breaks its rule, waits for words; blanks are none', () => {
  const item = (id: string, outcome: ChecklistItem['outcome'], answer: string | null) =>
    ({ id, outcome, answer, title: id, finding: '', rule: '' }) satisfies ChecklistItem;
  const list = [
    item('a', 'good', null),
    item('b', 'asked', ' '),
    item('c', 'asked', 'Yes.'),
    item('d', 'bad', null),
    item('e', 'look', null),
  ];
  expect(unanswered(list).map(({ id }) => id)).toEqual(['b', 'd']);
  expect(list.map((each) => outcomeBadge(each).label)).toEqual([
    'Good',
    'Asked',
    'Answered',
    'Against the rule',
    'Worth a look',
  ]);
});

test('a point says where it stands: station, chainage, time, or the whole run', () => {
  const stations = [{ name: 'Tornick bridge', chainage: 10600 }];
  const at = (chainage: number | null, time: number | null) =>
    pointPlace({ chainage, time }, stations, 48 * 3600, 'metric');
  expect(at(null, null)).toBeNull();
  expect(at(10600, null)).toBe('Tornick bridge, 10.60 km');
  expect(at(10600, 22.5 * 3600)).toBe('Tornick bridge, 10.60 km, 22 h 30');
  expect(at(1000, 0)).toBe('1.00 km, 0 h 00');
});

test('open points come first and closed ones last, in the order they were raised', () => {
  const point = (id: number, state: ReviewPoint['state']) => ({ id, state }) as ReviewPoint;
  const sorted = sortPoints([
    point(1, 'closed'),
    point(2, 'answered'),
    point(4, 'open'),
    point(3, 'open'),
  ]);
  expect(sorted.map(({ id }) => id)).toEqual([3, 4, 2, 1]);
});

test('the modeller answers, whoever checks closes or opens again, and nobody else may', () => {
  const labels = (state: ReviewPoint['state'], ...may: Parameters<typeof pointSteps>[1]) =>
    pointSteps({ state }, may).map(({ step }) => step);
  expect(labels('open', 'review.answer')).toEqual(['answer']);
  expect(labels('closed', 'review.answer')).toEqual([]);
  expect(labels('open', 'review.close')).toEqual(['close']);
  expect(labels('answered', 'review.close')).toEqual(['close', 'reopen']);
  expect(labels('closed', 'review.close')).toEqual(['reopen']);
  expect(labels('open')).toEqual([]);
});

test('age is told as coarsely as it matters', () => {
  const now = Date.parse('2025-11-14T12:00:00Z');
  expect(ageWords('2025-11-14T11:59:30Z', now)).toBe('a minute');
  expect(ageWords('2025-11-14T11:15:00Z', now)).toBe('45 min');
  expect(ageWords('2025-11-14T03:00:00Z', now)).toBe('9 h');
  expect(ageWords('2025-11-10T12:00:00Z', now)).toBe('4 days');
  expect(ageWords('2025-11-14T12:00:05Z', now)).toBe('a minute');
});
