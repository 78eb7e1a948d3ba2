/** When something was handed in, in the clock of whoever reads it: `14 Nov 2026, 18:12`. */
export const sentOn = (iso: string): string =>
  new Date(iso).toLocaleString('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  });
