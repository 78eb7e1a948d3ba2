import type { Faults } from '../faults';
import { checkSeries } from '../seriesFaults';
import { checkNumber } from './fields';

export function checkSluice(faults: Faults, path: string, value: unknown): void {
  const required = ['kind', 'id', 'chainage', 'width', 'sill', 'times', 'openings'];
  if (!faults.record(path, value, required, ['contraction'])) return;
  checkNumber(faults, path, value, 'width', { what: 'a width', unit: 'length', above: 0 });
  checkNumber(faults, path, value, 'sill', { what: 'a level', unit: 'elevation' });
  const what = 'a coefficient of contraction';
  checkNumber(faults, path, value, 'contraction', { what, least: 0.5, most: 1 });
  checkSeries(faults, path, value, {
    at: 'times',
    values: ['openings'],
    notNegative: ['openings'],
  });
}
