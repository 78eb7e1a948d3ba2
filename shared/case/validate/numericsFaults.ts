import { q, say, typed } from '../../units/message';
import type { Quantity } from '../../units/units';
import { CASE_LIMITS } from '../caseLimits';
import type { ReachEnds } from './boundaryFaults';
import { kindOf, type Faults } from './faults';

export function checkNumerics(
  faults: Faults,
  value: unknown,
  ends: ReachEnds,
  sections: number,
): void {
  const path = 'numerics';
  const required = ['cellSize', 'duration', 'outputInterval'];
  if (!faults.record(path, value, required, ['order', 'courant', 'dryDepth', 'momentum'])) return;

  const positive = (key: string, what: string, unit?: Quantity): number | null => {
    if (!(key in value) || !faults.number(`numerics.${key}`, value[key], what, unit)) return null;
    const given = value[key] as number;
    if (given > 0) return given;
    faults.add(
      `numerics.${key}`,
      say`is ${unit ? typed(given, unit) : given}; ${what} must be above 0`,
    );
    return null;
  };
  const cellSize = positive('cellSize', 'a cell size', 'length');
  const duration = positive('duration', 'a duration in s');
  const interval = positive('outputInterval', 'an output interval in s');

  if (cellSize !== null && ends && (ends[1] - ends[0]) / cellSize > CASE_LIMITS.cells + 0.5) {
    const smallest = (ends[1] - ends[0]) / CASE_LIMITS.cells;
    faults.add(
      'numerics.cellSize',
      say`${typed(cellSize, 'length')} makes more than ${CASE_LIMITS.cells} cells; use at least ${q(smallest, 'length', { figures: 3 })}`,
    );
  }
  if (duration !== null && duration > CASE_LIMITS.duration) {
    faults.add('numerics.duration', `${duration} s is longer than thirty years; check the unit`);
  }
  if (duration !== null && interval !== null) {
    const outputs = Math.ceil(duration / interval) + 1;
    const most = Math.min(
      CASE_LIMITS.outputTimes,
      Math.floor(CASE_LIMITS.outputValues / Math.max(1, sections)),
    );
    if (outputs > most) {
      faults.add(
        'numerics.outputInterval',
        `${interval} s gives ${outputs} output times of ${sections} sections; at most ${most} are kept: ` +
          `use at least ${Math.ceil(duration / (most - 1))} s`,
      );
    }
  }
  if (value.order !== undefined && value.order !== 1 && value.order !== 2) {
    faults.add('numerics.order', 'must be 1 or 2');
  }
  if (
    value.courant !== undefined &&
    faults.number('numerics.courant', value.courant, 'a Courant number')
  ) {
    if (value.courant <= 0 || value.courant > 1) {
      faults.add(
        'numerics.courant',
        `is ${value.courant}; it must lie above 0 and up to 1 (0.8 is sound)`,
      );
    }
  }
  if (
    value.dryDepth !== undefined &&
    faults.number('numerics.dryDepth', value.dryDepth, 'a depth', 'depth')
  ) {
    if (value.dryDepth <= 0 || value.dryDepth > 0.1) {
      faults.add(
        'numerics.dryDepth',
        say`is ${typed(value.dryDepth, 'depth')}; it must lie above 0 and up to ${typed(0.1, 'depth')}`,
      );
    }
  }
  if (value.momentum !== undefined && !['uniform', 'compound'].includes(value.momentum as string)) {
    faults.add('numerics.momentum', `must be uniform or compound, not ${kindOf(value.momentum)}`);
  }
}
