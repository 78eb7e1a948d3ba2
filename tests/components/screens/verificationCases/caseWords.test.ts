import { countWords, errorWords, stateOf } from '@/components/screens/verificationCases/caseWords';
import type { VerificationCaseRow } from '@/shared/verificationCases/types';
import { boundText, formatError, measuredText } from '@/shared/verificationCases/words';

const row = (parts: Partial<VerificationCaseRow>): VerificationCaseRow => ({
  id: 'a',
  group: 'dam',
  title: 'A',
  setup: '',
  source: '',
  shows: '',
  doesNotShow: '',
  boundReason: '',
  latest: null,
  result: null,
  ...parts,
});
const norms = (l1: number) => ({ l1, l2: 2 * l1, max: 3 * l1 });
const result = (within: boolean, isCurrent = true, l1 = 7.54e-3) => ({
  within,
  isCurrent,
  solver: '1.2.0',
  computedAt: '2026-12-01T10:00:00Z',
  requestedBy: 'Ines Corrow',
  seconds: 2,
  stage: norms(l1),
  flow: norms(l1),
});
const latest = (
  state: 'queued' | 'running' | 'failed' | 'finished' | 'cancelled',
  progress = 0,
) => ({ state, progress, failure: null, taskSetId: 1, at: null });

test('what goes on is said first, then what was found last', () => {
  const found = result(true);
  expect(stateOf(row({})).label).toBe('Not run yet');
  expect(stateOf(row({ latest: latest('queued'), result: found })).label).toBe('Waiting');
  expect(stateOf(row({ latest: latest('running', 0.419) })).label).toBe('Running, 41 %');
  expect(stateOf(row({ latest: latest('finished'), result: found })).label).toBe('Within bounds');
  expect(stateOf(row({ latest: latest('finished'), result: result(false) })).label).toBe(
    'Outside bounds',
  );
  expect(stateOf(row({ latest: latest('failed'), result: found })).label).toBe(
    'Stopped with a fault',
  );
  expect(stateOf(row({ latest: latest('cancelled') })).label).toBe('Cancelled');
  expect(stateOf(row({ latest: latest('cancelled'), result: found })).label).toBe('Within bounds');
});

test('all cases in a sentence, each kind counted', () => {
  expect(
    countWords([
      row({ result: result(true), latest: latest('finished') }),
      row({ result: result(true, false), latest: latest('running') }),
      row({ result: result(false), latest: latest('finished') }),
      row({ latest: latest('failed') }),
      row({}),
    ]),
  ).toBe(
    '2 of 5 within their bounds, 1 outside, 1 under way, 1 stopped with a fault, 2 without a result, 1 of an older solver.',
  );
});

test('before the first run', () => {
  expect(countWords([row({}), row({})])).toBe('None of the 2 cases has been run yet.');
});

test('errors with three digits, small ones by their power of ten', () => {
  expect(formatError(0)).toBe('0');
  expect(formatError(7.54e-3)).toBe('0.00754');
  expect(formatError(124.3)).toBe('124');
  expect(formatError(5.123e-5)).toBe('5.12 × 10⁻⁵');
  expect(formatError(-2.4e-12)).toBe('-2.40 × 10⁻¹²');
  expect(formatError(null)).toBe('–');
  expect(errorWords(row({ result: result(true) }))).toBe('Mean difference 0.00754 m, 0.00754 m³/s');
  expect(errorWords(row({ result: result(true, true, 1e-14) }))).toBe('No difference but rounding');
  expect(errorWords(row({}))).toBeNull();
});

test('a bound reads with its direction and its unit', () => {
  const stage = { measure: 'stageL1', value: 7.54e-3, bound: 9.5e-3, within: true } as const;
  expect(measuredText(stage)).toBe('0.00754 m');
  expect(boundText(stage)).toBe('at most 0.00950 m');
  const order = { measure: 'flowOrder', value: null, bound: 0.8, within: false } as const;
  expect(measuredText(order)).toBe('not measurable');
  expect(boundText(order)).toBe('at least 0.80');
});
