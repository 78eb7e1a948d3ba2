import type { ChecklistItem, Review, ReviewState } from '../../../shared/review/types';
import { may } from '../../policies/decide';
import type { Actor, Subject } from '../../policies/subject';

interface Standing {
  runNumber: number;
  routed: boolean;
  state: ReviewState | null;
  checklist: ChecklistItem[];
  points: { state: string }[];
}

/** Why a person cannot sign, a line each. */
interface Signer {
  id: number;
  qualification: string | null;
  registrationNumber: string | null;
}

/** What still stands against a signature, whoever gives it. Pure. */
export function obstaclesOf({ routed, state, checklist, points }: Standing): string[] {
  if (state === 'signed' || state === 'issued') return ['It is signed already.'];
  if (state === 'withdrawn') return ['The signature was withdrawn; a new run is signed instead.'];
  const lines: string[] = [];
  if (!routed) lines.push('The run is not routed.');
  if (state === null) lines.push('It was not sent for checking.');
  if (state === 'returned') lines.push('It was returned to the modeller and not sent again.');
  const count = (wanted: string) => points.filter((point) => point.state === wanted).length;
  const [open, answered] = [count('open'), count('answered')];
  if (open > 0) lines.push(`${open === 1 ? 'One point is' : `${open} points are`} open.`);
  if (answered > 0)
    lines.push(
      `${answered === 1 ? 'One point is' : `${answered} points are`} answered and not closed.`,
    );
  for (const { answer, outcome, title } of checklist) {
    if (answer) continue;
    if (outcome === 'asked') lines.push(`“${title}” waits for the modeller's words.`);
    if (outcome === 'bad')
      lines.push(`“${title}” breaks its rule, and the modeller has not said why.`);
  }
  return lines;
}

/** The same of the person. Pure. */
export function signerObstacles(signer: Signer, requestedBy: number): string[] {
  const lines: string[] = [];
  if (signer.id === requestedBy)
    lines.push('You asked for this run; somebody else has to sign it.');
  if (!signer.qualification?.trim()) lines.push('Your profile names no qualification.');
  if (!signer.registrationNumber?.trim()) lines.push('Your profile names no registration number.');
  return lines;
}

type May = Review['may'][number];

/** What a state allows; who, the table of rights says. */
const POSSIBLE: Record<May, (ReviewState | null)[]> = {
  'review.send': [null, 'returned'],
  'review.answer': [null, 'inCheck', 'returned'],
  'review.raise': ['inCheck'],
  'review.close': ['inCheck', 'returned'],
  'review.return': ['inCheck'],
  'review.sign': ['inCheck'],
  'review.issue': ['signed'],
  'review.withdraw': ['signed', 'issued'],
};

export const allowedNow = (actor: Actor, subject: Subject, state: ReviewState | null): May[] =>
  (Object.keys(POSSIBLE) as May[]).filter(
    (action) => POSSIBLE[action].includes(state) && may(actor, action, subject),
  );
