import { join, type Faults } from '../faults';
import { checkCrest, checkNumber, checkWord } from './fields';

export function checkWeir(faults: Faults, path: string, value: unknown): void {
  const required = ['kind', 'id', 'chainage', 'crest', 'form'];
  if (!faults.record(path, value, required, ['coefficient'])) return;
  checkCrest(faults, join(path, 'crest'), value.crest);
  checkWord(faults, path, value, 'form', ['broad', 'sharp']);
  const what = 'a discharge coefficient';
  checkNumber(faults, path, value, 'coefficient', { what, above: 0, most: 2 });
}
