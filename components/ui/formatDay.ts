/** A day as people write it, e.g. `14 Nov 2025`, in the reader's own time zone. */
export const formatDay = (iso: string): string =>
  new Date(iso).toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
