/** A flood that nobody has named is still one. */
export const floodName = (flood: string): string => flood || 'Flood without a name';

/** A difference with its sign: which way the model leans. */
export const signed = (text: string, value: number): string =>
  value > 0 && /[1-9]/.test(text) ? `+${text}` : text;
