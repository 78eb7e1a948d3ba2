import { say, typed } from '../../units/message';
import { join, type Faults } from './faults';
import { checkSeries } from './seriesFaults';

/** The level pool at the head of the reach. */
export function checkReservoir(faults: Faults, path: string, value: unknown): void {
  const required = ['kind', 'stages', 'volumes', 'initialStage', 'inflow'];
  if (!faults.record(path, value, required, ['spillway'])) return;
  checkSeries(faults, path, value, {
    at: 'stages',
    values: ['volumes'],
    notNegative: ['volumes'],
    rising: ['volumes'],
    least: 2,
  });
  const { stages, initialStage, inflow, spillway } = value;
  if ('initialStage' in value) {
    const at = join(path, 'initialStage');
    if (
      faults.number(at, initialStage, 'a stage', 'elevation') &&
      Array.isArray(stages) &&
      (initialStage < stages[0] || initialStage > stages[stages.length - 1])
    ) {
      faults.add(
        at,
        say`${typed(initialStage, 'elevation')} lies outside the stages of the storage table; extend it`,
      );
    }
  }
  if ('inflow' in value && faults.record(join(path, 'inflow'), inflow, ['times', 'flows'])) {
    checkSeries(faults, join(path, 'inflow'), inflow, {
      at: 'times',
      values: ['flows'],
      notNegative: ['flows'],
    });
  }
  if (spillway === undefined) return;
  if (faults.record(join(path, 'spillway'), spillway, ['stages', 'flows'])) {
    checkSeries(faults, join(path, 'spillway'), spillway, {
      at: 'stages',
      values: ['flows'],
      notNegative: ['flows'],
      notFalling: ['flows'],
      least: 2,
    });
  }
}
