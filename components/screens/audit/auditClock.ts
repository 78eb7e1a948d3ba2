/** To the second, in the reader's own time zone, e.g. `14 Nov 2025, 18:12:05`. */
export const auditClock = (iso: string): string =>
  new Date(iso).toLocaleString('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  });
