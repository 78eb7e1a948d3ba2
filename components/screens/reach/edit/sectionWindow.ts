import type { Section } from '@/shared/surveys/types';
import type { Window } from './editDrawingModel';

/** Least width that can be shown, m. */
const LEAST = 0.5;

export const wholeWindow = ({ points }: Pick<Section, 'points'>): Window => [
  Math.min(...points.map(([y]) => y)),
  Math.max(...points.map(([y]) => y)),
];

/** From bank to bank with a fifth of room on either side; null without bank marks. */
export function channelWindow(section: Pick<Section, 'points' | 'banks'>): Window | null {
  if (!section.banks) return null;
  const [left, right] = section.banks;
  return within(section, [left - 0.2 * (right - left), right + 0.2 * (right - left)]);
}

/** The window made wider (factor above 1) or narrower about an offset, never beyond the section. */
export function scaledWindow(
  section: Pick<Section, 'points'>,
  [from, to]: Window,
  about: number,
  factor: number,
): Window {
  const width = Math.max(LEAST, (to - from) * factor);
  return within(section, [about - width / 2, about + width / 2]);
}

/** The window moved, at its width, so that an offset is seen. */
export function windowShowing(
  section: Pick<Section, 'points'>,
  [from, to]: Window,
  offset: number,
): Window {
  if (offset >= from && offset <= to) return [from, to];
  return scaledWindow(section, [from, to], offset, 1);
}

function within(section: Pick<Section, 'points'>, [from, to]: Window): Window {
  const [first, last] = wholeWindow(section);
  if (to - from >= last - first) return [first, last];
  if (from < first) return [first, first + (to - from)];
  if (to > last) return [last - (to - from), last];
  return [from, to];
}
