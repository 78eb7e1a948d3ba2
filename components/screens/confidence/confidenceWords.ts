import type { BadgeTone } from '@/components/ui/Badge';
import type { Crumb } from '@/components/layout/Crumbs';
import type { ConfidenceKind } from '@/shared/confidence/schemas';
import type { Distribution, DistributionKind } from '@/shared/confidence/distributions';
import { TASK_STATE_WORDS, type TaskSetRow, type TaskState } from '@/shared/tasks/types';
import { formatDuration, formatNumber } from '@/shared/units/format';

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

export const DISTRIBUTION_NAMES: Record<DistributionKind, string> = {
  lognormal: 'Lognormal',
  normal: 'Normal',
  triangular: 'Triangular',
  uniform: 'Uniform',
};

/** Its fields with what they are called. */
export const DISTRIBUTION_FIELDS: Record<DistributionKind, [field: string, label: string][]> = {
  lognormal: [
    ['median', 'Median'],
    ['spread', 'Geometric standard deviation'],
  ],
  normal: [
    ['mean', 'Mean'],
    ['deviation', 'Standard deviation'],
  ],
  triangular: [
    ['low', 'Lowest'],
    ['mode', 'Most likely'],
    ['high', 'Highest'],
  ],
  uniform: [
    ['low', 'Lowest'],
    ['high', 'Highest'],
  ],
};

const digits = (value: number) => String(Number(value.toPrecision(3)));

/** `lognormal, median 1, geometric standard deviation 1.2`. */
export function distributionWords(distribution: Distribution): string {
  const given = distribution as unknown as Record<string, number>;
  const parts = DISTRIBUTION_FIELDS[distribution.kind].map(
    ([field, label]) => `${label.toLowerCase()} ${digits(given[field])}`,
  );
  return [DISTRIBUTION_NAMES[distribution.kind].toLowerCase(), ...parts].join(', ');
}

/** A change with its sign, e.g. `+0.31 m`. */
export const signed = (text: string, value: number): string => (value < 0 ? text : `+${text}`);

/** A change of time, e.g. `−12 min` or `+1 h 05`. */
export function timeChange(seconds: number): string {
  const minutes = Math.round(Math.abs(seconds) / 60);
  const sign = seconds < 0 && minutes > 0 ? '−' : '+';
  return minutes < 60 ? `${sign}${minutes} min` : `${sign}${formatDuration(60 * minutes)}`;
}

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
