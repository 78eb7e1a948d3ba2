import type { PictureSource } from './pictureContext';

/** A file name that says what it is, e.g. `run-3-stage-at-tornick-bridge-preliminary`, without its kind. */
export function pictureName(title: string, { stem, ending }: PictureSource): string {
  const end = ending ? `-${plain(ending)}` : '';
  return (
    plain(`${stem} ${title}`)
      .slice(0, 100 - end.length)
      .replace(/-$/, '') + end
  );
}

const plain = (words: string): string =>
  words
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');

/** The name of a drawing: its sentence for screen readers up to the first value. */
export const pictureTitle = (label: string): string => label.split(/[;:]|\. /)[0].trim();
