import { reportWords, standingWords } from '@/components/screens/reports/reportWords';

test('a report made before the signature is said to be preliminary', () => {
  expect(standingWords(null)).toContain('PRELIMINARY');
  expect(standingWords('returned')).toContain('PRELIMINARY');
  expect(standingWords('issued')).not.toContain('PRELIMINARY');
  expect(standingWords('withdrawn')).toContain('WITHDRAWN');
});

test('a kept report in a line', () => {
  expect(
    reportWords({
      id: 1,
      paper: 'LETTER',
      standing: 'signed',
      hash: 'aa',
      bytes: 210_400,
      pages: 14,
      createdAt: '2025-11-14T12:00:00Z',
    }),
  ).toBe('Signed, US Letter, 14 pages, 210 kB, 14 Nov 2025');
});
