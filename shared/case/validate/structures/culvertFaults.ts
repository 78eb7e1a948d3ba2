import { CULVERT_INLET_NAMES } from '../../structures';
import { join, type Faults } from '../faults';
import { checkCrest, checkNumber, checkWord } from './fields';

const REQUIRED = [
  'kind',
  'id',
  'chainage',
  'shape',
  'barrels',
  'n',
  'length',
  'invertUp',
  'invertDown',
  'inlet',
];

export function checkCulvert(faults: Faults, path: string, value: unknown): void {
  const shape =
    typeof value === 'object' && value !== null && 'shape' in value ? value.shape : undefined;
  const size = shape === 'box' ? ['width', 'height'] : ['diameter'];
  const optional = ['crest', 'crestCoefficient'];
  if (!faults.record(path, value, [...REQUIRED, ...size], optional)) return;
  checkWord(faults, path, value, 'shape', ['circular', 'box']);
  checkWord(faults, path, value, 'inlet', CULVERT_INLET_NAMES);
  for (const key of size) {
    checkNumber(faults, path, value, key, { what: 'a size', unit: 'length', above: 0, most: 100 });
  }
  const count = { what: 'a number of barrels', least: 1, most: 100 };
  if (checkNumber(faults, path, value, 'barrels', count) && !Number.isInteger(value.barrels)) {
    faults.add(join(path, 'barrels'), `is ${String(value.barrels)}; barrels are whole`);
  }
  checkNumber(faults, path, value, 'n', { what: "Manning's n", above: 0, most: 1 });
  const hasLength = checkNumber(faults, path, value, 'length', {
    what: 'a length',
    unit: 'length',
    above: 0,
  });
  const levels = ['invertUp', 'invertDown'].map((key) =>
    checkNumber(faults, path, value, key, { what: 'a level', unit: 'elevation' }),
  );
  if (hasLength && levels.every(Boolean)) {
    const slope =
      ((value.invertUp as number) - (value.invertDown as number)) / (value.length as number);
    if (Math.abs(slope) > 0.5) {
      faults.add(
        join(path, 'invertDown'),
        `makes a slope of ${slope.toFixed(2)} (fall over length); check inverts and length`,
      );
    }
  }
  if (value.crest !== undefined) checkCrest(faults, join(path, 'crest'), value.crest);
  const what = 'a discharge coefficient';
  checkNumber(faults, path, value, 'crestCoefficient', { what, above: 0, most: 2 });
  const isPipe = typeof value.inlet === 'string' && !value.inlet.startsWith('box');
  if (
    (shape === 'box' && isPipe) ||
    (shape === 'circular' && typeof value.inlet === 'string' && !isPipe)
  ) {
    faults.add(
      join(path, 'inlet'),
      `${String(value.inlet)} is no inlet of a ${String(shape)} barrel`,
    );
  }
}
