let count = 0;

/** Tells made things apart. */
export const nextNumber = (): number => ++count;
