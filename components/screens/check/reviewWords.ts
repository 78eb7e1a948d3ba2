import type { BadgeTone } from '@/components/ui/Badge';
import { shortTime } from '@/components/charts/geometry/timeWords';
import type { Role } from '@/shared/accounts/roles';
import {
  REVIEW_STATE_WORDS,
  type ChecklistItem,
  type ReviewPoint,
  type ReviewState,
} from '@/shared/review/types';
import type { RunRow } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { RUN_TONES, runStateWords } from '../runs/runWords';

interface Badge {
  label: string;
  tone: BadgeTone;
}

const TONES: Record<ReviewState, BadgeTone> = {
  inCheck: 'earth',
  returned: 'ochre',
  signed: 'moss',
  issued: 'moss',
  withdrawn: 'brick',
};

/** State of a run with that of its checking: nothing routed looks finished before it is signed. */
export function runBadge(run: Pick<RunRow, 'state' | 'progress' | 'review'>): Badge {
  if (run.state !== 'routed') return { label: runStateWords(run), tone: RUN_TONES[run.state] };
  if (!run.review) return { label: 'Routed, unsigned', tone: 'ochre' };
  return { label: REVIEW_STATE_WORDS[run.review], tone: TONES[run.review] };
}

/** What leads from the results of a run to its check: the one solid button there. */
export function checkLabel(review: ReviewState | null, roles: readonly Role[]): string {
  if (review === null) return roles.includes('modeller') ? 'Send for checking' : 'Open the check';
  if (review === 'returned' && roles.includes('modeller')) return 'Mend and send again';
  if (review === 'inCheck' && roles.includes('seniorEngineer')) return 'Check this run';
  if (review === 'signed') return 'Issue to the client';
  return 'Open the check';
}

const OUTCOMES: Record<ChecklistItem['outcome'], Badge> = {
  good: { label: 'Good', tone: 'moss' },
  look: { label: 'Worth a look', tone: 'ochre' },
  bad: { label: 'Against the rule', tone: 'brick' },
  asked: { label: 'Asked', tone: 'ochre' },
};

/** What came of an item, in a word or two. */
export const outcomeBadge = ({ outcome, answer }: ChecklistItem): Badge =>
  outcome === 'asked' && answer?.trim() ? { label: 'Answered', tone: 'earth' } : OUTCOMES[outcome];

/** Items that wait for the modeller's words before the run can be signed. */
export const unanswered = (checklist: readonly ChecklistItem[]): ChecklistItem[] =>
  checklist.filter(
    ({ outcome, answer }) => (outcome === 'asked' || outcome === 'bad') && !answer?.trim(),
  );

export const POINT_STATES: Record<ReviewPoint['state'], Badge> = {
  open: { label: 'Open', tone: 'ochre' },
  answered: { label: 'Answered', tone: 'earth' },
  closed: { label: 'Closed', tone: 'moss' },
};

/** Where on the run a point stands, in words; null: on the run as a whole. */
export function pointPlace(
  { chainage, time }: Pick<ReviewPoint, 'chainage' | 'time'>,
  stations: readonly { name: string; chainage: number }[],
  span: number,
  system: UnitSystem,
): string | null {
  if (chainage === null) return time === null ? null : shortTime(time, span);
  const station = stations.find((each) => Math.abs(each.chainage - chainage) < 0.005);
  const where = formatWithUnit(chainage, 'chainage', system);
  const place = station ? `${station.name}, ${where}` : where;
  return time === null ? place : `${place}, ${shortTime(time, span)}`;
}

/** Open points first, then what waits to be closed; closed ones last, each in the order they were raised. */
export function sortPoints(points: readonly ReviewPoint[]): ReviewPoint[] {
  const rank = { open: 0, answered: 1, closed: 2 };
  return [...points].sort((a, b) => rank[a.state] - rank[b.state] || a.id - b.id);
}

/** How long something has waited, as a person would say it. */
export function ageWords(iso: string, now: number): string {
  const minutes = Math.max(0, Math.floor((now - Date.parse(iso)) / 60_000));
  if (minutes < 2) return 'a minute';
  if (minutes < 90) return `${minutes} min`;
  const hours = Math.round(minutes / 60);
  if (hours < 36) return `${hours} h`;
  return `${Math.round(hours / 24)} days`;
}
