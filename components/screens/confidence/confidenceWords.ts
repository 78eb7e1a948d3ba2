import type { BadgeTone } from '@/components/ui/Badge';
import type { Crumb } from '@/components/layout/Crumbs';
import type { ConfidenceKind } from '@/shared/confidence/schemas';
import { TASK_STATE_WORDS, type TaskSetRow, type TaskState } from '@/shared/tasks/types';
import { formatNumber } from '@/shared/units/format';

export const KIND_TITLES: Record<ConfidenceKind, string> = {
  convergence: 'Cell-size convergence',
  sensitivity: 'Sensitivity',
  ensemble: 'Ensemble',
};

const STATE_TONES: Record<TaskState, BadgeTone> = {
  queued: 'soft',
  running: 'earth',
  finished: 'moss',
  failed: 'brick',
  cancelled: 'soft',
};

/** State of a set in a word or two, with its percent while it computes. */
export function setBadge({ state, progress, failed }: TaskSetRow): {
  label: string;
  tone: BadgeTone;
} {
  const label =
    state === 'running'
      ? `Running, ${Math.min(99, Math.floor(progress * 100))} %`
      : TASK_STATE_WORDS[state];
  return state === 'finished' && failed > 0
    ? { label: `${label}, ${failed} failed`, tone: 'ochre' }
    : { label, tone: STATE_TONES[state] };
}

export const confidenceCrumbs = (study: { id: number; title: string }, here?: string): Crumb[] => [
  { label: study.title, href: `/studies/${study.id}` },
  here ? { label: 'Confidence', href: `/studies/${study.id}/confidence` } : { label: 'Confidence' },
  ...(here ? [{ label: here }] : []),
];

/** Computing time in all, as a person would say it. */
export function computingWords(seconds: number): string {
  if (seconds < 5) return 'a few seconds of computing';
  if (seconds < 90) return `about ${Math.round(seconds / 5) * 5} s of computing`;
  if (seconds < 5400) return `about ${Math.round(seconds / 60)} min of computing`;
  return `about ${formatNumber(seconds / 3600, 1)} h of computing`;
}

/** By the pace of the run itself: twice as many cells take half as long a step. */
export const estimate = (
  { seconds, cells }: { seconds: number; cells: number },
  members: readonly number[],
): number => members.reduce((sum, count) => sum + seconds * (count / cells) ** 2, 0);
