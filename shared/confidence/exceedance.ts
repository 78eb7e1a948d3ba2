/** How many members are above a level, of how many. */
export interface Exceedance {
  above: number;
  of: number;
}

/** Members whose value is above `level`; a value at the level itself is not. */
export const exceedance = (values: readonly number[], level: number): Exceedance => ({
  above: values.filter((value) => value > level).length,
  of: values.length,
});
