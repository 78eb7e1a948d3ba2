/** Size of a file in MB as people read it, without the unit. */
export const megabytes = (bytes: number): string =>
  (bytes / 1024 / 1024).toLocaleString('en-GB', {
    minimumFractionDigits: 1,
    maximumFractionDigits: bytes < 1024 * 1024 ? 2 : 1,
  });
