/** A number of the file in a sentence: three decimals at most, thousands parted. */
export const showNumber = (value: number): string =>
  value.toLocaleString('en-GB', { maximumFractionDigits: 3 }).replace('-', '−');

/** Two numbers side by side with the same decimals, so that they compare at a glance. */
export function showAlike(...values: number[]): string[] {
  const decimals = Math.max(...values.map((value) => showNumber(value).split('.')[1]?.length ?? 0));
  return values.map((value) =>
    value
      .toLocaleString('en-GB', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })
      .replace('-', '−'),
  );
}
