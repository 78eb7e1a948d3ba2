import { reportWords, standingWords } from '@/components/screens/reports/reportWords';

test('a report made before the signature is said to be preliminary', () => {
  expect(standingWords(null)).toContain('PRELIMINARY');
  expect(standingWords('returned')).toContain('PRELIMINARY');
  expect(standingWords('issued')).not.toContain('PRELIMINARY');
  expect(standingWords('withdrawn')).toContain('WITHDRAWN');
});

test('a kept report in a line', () => {
  const report = {
    id: 1,
    paper: 'LETTER',
    annex: false,
    standing: 'signed',
    hash: 'aa',
    bytes: 210_400,
    pages: 14,
    createdAt: '2025-11-14T12:00:00Z',
  } as const;
  expect(reportWords(report)).toBe('Signed, US Letter, 14 pages, 210 kB, 14 Nov 2025');
  expect(reportWords({ ...report, annex: true })).toContain('US Letter, with the annex, 14 pages');
});
