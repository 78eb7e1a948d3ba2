import { PIER_SHAPE_NAMES } from '../../structures';
import { join, type Faults } from '../faults';
import { checkCrest, checkNumber, checkWord } from './fields';

export function checkBridge(faults: Faults, path: string, value: unknown): void {
  const required = ['kind', 'id', 'chainage', 'piers', 'obstructed', 'soffit'];
  if (!faults.record(path, value, required, ['contraction', 'deck', 'deckCoefficient'])) return;
  checkWord(faults, path, value, 'piers', PIER_SHAPE_NAMES);
  const share = { what: 'a share of the flow area', least: 0, most: 0.5 };
  checkNumber(faults, path, value, 'obstructed', share);
  checkNumber(faults, path, value, 'soffit', { what: 'a level', unit: 'elevation' });
  const contraction = { what: 'a coefficient of contraction', least: 0.5, most: 1 };
  checkNumber(faults, path, value, 'contraction', contraction);
  if (value.deck !== undefined) checkCrest(faults, join(path, 'deck'), value.deck);
  const what = 'a discharge coefficient';
  checkNumber(faults, path, value, 'deckCoefficient', { what, above: 0, most: 2 });
}
