/** Letter of a 0-based column as a spreadsheet counts: 0 is A, 26 is AA. */
export function columnLetter(column: number): string {
  let letters = '';
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26)) {
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  }
  return letters;
}
