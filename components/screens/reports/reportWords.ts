import { formatDay } from '@/components/ui/formatDay';
import type { Paper, ReportRow } from '@/shared/reports/types';
import type { ReviewState } from '@/shared/review/types';
import { formatNumber } from '@/shared/units/format';

export const PAPER_NAMES: Record<Paper, string> = { A4: 'A4', LETTER: 'US Letter' };

/** What a report that is made now would be. */
export function standingWords(review: ReviewState | null): string {
  if (review === 'withdrawn') return 'The signature was withdrawn: every page is marked WITHDRAWN.';
  if (review === 'signed' || review === 'issued')
    return 'Signed: made once for each paper, kept, and the same to the last byte each time.';
  return 'Until the run is signed every page is marked PRELIMINARY.';
}

const STANDINGS: Record<ReportRow['standing'], string> = {
  preliminary: 'Preliminary',
  signed: 'Signed',
  withdrawn: 'Withdrawn',
};

/** A kept report in a line: `Signed, A4, 14 pages, 210 kB, 14 Nov 2025`. */
export const reportWords = ({
  standing,
  paper,
  annex,
  pages,
  bytes,
  createdAt,
}: ReportRow): string =>
  [
    STANDINGS[standing],
    PAPER_NAMES[paper],
    ...(annex ? ['with the annex'] : []),
    pages === 1 ? '1 page' : `${pages} pages`,
    `${formatNumber(Math.max(1, bytes / 1000), 0)} kB`,
    formatDay(createdAt),
  ].join(', ');
