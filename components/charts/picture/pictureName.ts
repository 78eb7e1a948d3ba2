import type { PictureSource } from './pictureContext';

/** A file name that says what it is, e.g. `run-3-stage-at-tornick-bridge-preliminary`, without its ending. */
export function pictureName(title: string, { stem, state }: PictureSource): string {
  const kept = [stem, title, state.split(',')[0]].join(' ').normalize('NFKD').toLowerCase();
  return kept
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
    .slice(0, 100);
}

/** The name of a drawing: its sentence for screen readers up to the first value. */
export const pictureTitle = (label: string): string => label.split(/[;:]|\. /)[0].trim();
