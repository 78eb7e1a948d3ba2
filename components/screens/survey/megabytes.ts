const MEGABYTE = 1024 * 1024;

/** Size of a file in MB as people read it, without the unit: whole ones without a point. */
export const megabytes = (bytes: number): string =>
  (bytes / MEGABYTE).toLocaleString('en-GB', {
    minimumFractionDigits: bytes % MEGABYTE === 0 ? 0 : 1,
    maximumFractionDigits: bytes < MEGABYTE ? 2 : 1,
  });
