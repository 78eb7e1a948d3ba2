import type { NoticeTone } from '@/components/ui/Notice';
import { formatDay } from '@/components/ui/formatDay';
import type { Verification } from '@/shared/review/types';

/** What the standing of a report means for whoever holds it. */
export function standing(found: Verification): {
  tone: NoticeTone;
  title: string;
  text: string;
} {
  const { withdrawnAt, supersededAt } = found;
  const on = (iso: string | null) => (iso ? ` on ${formatDay(iso)}` : '');
  if (found.standing === 'withdrawn')
    return {
      tone: 'danger',
      title: `The signature was withdrawn${on(withdrawnAt)}`,
      text: 'Do not rely on this report. Ask the firm why, and what replaces it.',
    };
  if (found.standing === 'superseded')
    return {
      tone: 'attention',
      title: `Replaced by a newer signed run${on(supersededAt)}`,
      text: 'This report was signed, but a later one stands in its place. Ask the firm for it.',
    };
  return {
    tone: 'done',
    title: 'This report was signed, and the signature stands',
    text:
      found.standing === 'issued'
        ? 'It was issued to the client of the study.'
        : 'It has not been issued to the client of the study.',
  };
}

/** Is the file with this hash the very one? null: no report is kept to compare with. */
export function isTheVeryOne(
  hash: string,
  { reportHash, reportHashes }: Pick<Verification, 'reportHash' | 'reportHashes'>,
): boolean | null {
  const kept = [...reportHashes, ...(reportHash ? [reportHash] : [])];
  if (kept.length === 0) return null;
  return kept.some((each) => each.toLowerCase() === hash.toLowerCase());
}
