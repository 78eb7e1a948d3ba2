/** Reads a number as people type it: `1 250,5`, `1,250.5`, `−3`, `2.5e3`. A comma alone is the decimal sign unless
 *  it stands before exactly three digits with another comma before it (`1,250,000`). Empty is null, nonsense NaN. */
export function parseTyped(text: string): number | null {
  const bare = text.replace(/[\s\u00a0\u2009\u202f'’_]/g, '').replace(/[−–]/g, '-');
  if (bare === '') return null;
  const commas = bare.split(',').length - 1;
  const hasPoint = bare.includes('.');
  let plain = bare;
  if (commas === 1 && !hasPoint) plain = bare.replace(',', '.');
  else if (commas > 0) {
    const grouped = /^[+-]?\d{1,3}(,\d{3})+(\.\d*)?$/.test(bare);
    if (!grouped) return NaN;
    plain = bare.replaceAll(',', '');
  }
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain) ? Number(plain) : NaN;
}

/** As a person would type it: no groups, no needless zeros, up to ten digits. */
export const typedText = (value: number | null): string =>
  value === null || Number.isNaN(value) ? '' : String(Number(value.toPrecision(10)));
