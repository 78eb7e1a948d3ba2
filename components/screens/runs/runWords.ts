import { RUN_STATE_WORDS, type PlacePeaks, type RunRow, type RunState } from '@/shared/runs/types';
import type { BadgeTone } from '@/components/ui/Badge';
import { formatNumber } from '@/shared/units/format';

export const RUN_TONES: Record<RunState, BadgeTone> = {
  queued: 'soft',
  running: 'earth',
  routed: 'moss',
  failed: 'brick',
  cancelled: 'soft',
};

/** State of a run in a word or two, with its percent while it computes. */
export const runStateWords = ({ state, progress }: Pick<RunRow, 'state' | 'progress'>): string =>
  state === 'running' ? `Running, ${percent(progress)}` : RUN_STATE_WORDS[state];

/** Never 100 % before it is done. */
export const percent = (share: number): string =>
  `${Math.min(99, Math.floor(Math.max(0, share) * 100))} %`;

/** Wall time left as a person would say it. */
export function timeLeftWords(seconds: number | null): string {
  if (seconds === null) return 'time left not known yet';
  if (seconds < 10) return 'a few seconds left';
  if (seconds < 90) return `about ${Math.round(seconds / 10) * 10} s left`;
  if (seconds < 5400) return `about ${Math.round(seconds / 60)} min left`;
  return `about ${formatNumber(seconds / 3600, 1)} h left`;
}

/** Wall time that computing took. */
export function tookWords(seconds: number): string {
  if (seconds < 60) return `${formatNumber(seconds, seconds < 10 ? 1 : 0)} s`;
  return `${Math.floor(seconds / 60)} min ${String(Math.round(seconds % 60)).padStart(2, '0')} s`;
}

/** How the peak compares with what came in: `8 % less than in`; null where nothing came in. */
export function attenuationWords(attenuation: number | null): string | null {
  if (attenuation === null) return null;
  const share = Math.round(Math.abs(attenuation) * 100);
  if (share === 0) return 'as much as in';
  return `${share} % ${attenuation > 0 ? 'less' : 'more'} than in`;
}

/** Share of the inflow peak that is gone, for a table. */
export function attenuationFigure({ attenuation }: Pick<PlacePeaks, 'attenuation'>): string {
  return attenuation === null ? '–' : formatNumber(attenuation * 100, 0);
}
