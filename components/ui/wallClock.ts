/** A wall-clock time of the server in the words of the reader's place, e.g. `14 Nov 2025, 18:12`. */
export const wallClock = (iso: string): string =>
  new Date(iso).toLocaleString('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  });
