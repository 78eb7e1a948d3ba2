import { say, typed } from '../../units/message';
import { CASE_LIMITS } from '../caseLimits';
import { join, type Faults } from './faults';
import { checkReservoir } from './reservoirFaults';
import { checkSeries } from './seriesFaults';

/** Chainages of the first and the last section, where they can be used. */
export type ReachEnds = [number, number] | null;

export function checkUpstream(faults: Faults, value: unknown): void {
  const path = 'upstream';
  const kind = faults.kind(path, value, ['inflow', 'stage', 'reservoir', 'wall']);
  if (kind === 'inflow' && faults.record(path, value, ['kind', 'times', 'flows'])) {
    const rule = { at: 'times', values: ['flows'], notNegative: ['flows'] } as const;
    checkSeries(faults, path, value, rule);
  }
  if (kind === 'stage' && faults.record(path, value, ['kind', 'times', 'stages'])) {
    checkSeries(faults, path, value, { at: 'times', values: ['stages'] });
  }
  if (kind === 'reservoir') checkReservoir(faults, path, value);
  if (kind === 'wall') faults.record(path, value, ['kind']);
}

export function checkDownstream(faults: Faults, value: unknown): void {
  const path = 'downstream';
  const kinds = ['normalDepth', 'stage', 'rating', 'criticalDepth', 'open', 'wall'];
  const kind = faults.kind(path, value, kinds);
  if (kind === 'normalDepth') {
    if (!faults.record(path, value, ['kind', 'slope']) || !('slope' in value)) return;
    if (!faults.number('downstream.slope', value.slope, 'a slope')) return;
    if (value.slope <= 0 || value.slope > 1) {
      faults.add(
        'downstream.slope',
        `is ${value.slope}; the slope of normal depth lies above 0 and up to 1 (fall over length)`,
      );
    }
  } else if (kind === 'stage') {
    if (faults.record(path, value, ['kind', 'times', 'stages'])) {
      checkSeries(faults, path, value, { at: 'times', values: ['stages'] });
    }
  } else if (kind === 'rating') {
    if (!faults.record(path, value, ['kind', 'stages', 'flows'])) return;
    checkSeries(faults, path, value, {
      at: 'stages',
      values: ['flows'],
      notNegative: ['flows'],
      notFalling: ['flows'],
      least: 2,
    });
  } else if (kind !== null) faults.record(path, value, ['kind']);
}

export function checkLaterals(faults: Faults, value: unknown, ends: ReachEnds): void {
  if (!faults.array('laterals', value, 0, CASE_LIMITS.laterals)) return;
  value.forEach((lateral, k) => {
    const path = `laterals[${k}]`;
    if (!faults.record(path, lateral, ['from', 'to', 'times', 'flows'])) return;
    checkSeries(faults, path, lateral, { at: 'times', values: ['flows'] });
    const places = (['from', 'to'] as const).filter((key) => {
      if (!(key in lateral)) return false;
      const at = lateral[key];
      if (!faults.number(join(path, key), at, 'a chainage', 'chainage')) return false;
      if (!ends || (at >= ends[0] && at <= ends[1])) return true;
      return faults.add(
        join(path, key),
        say`chainage ${typed(at, 'chainage')} lies outside the reach, ${typed(ends[0], 'chainage')} to ${typed(ends[1], 'chainage')}`,
      );
    });
    if (places.length === 2 && (lateral.from as number) > (lateral.to as number)) {
      faults.add(
        path,
        say`from ${typed(lateral.from as number, 'chainage')} lies below to ${typed(lateral.to as number, 'chainage')}; swap them`,
      );
    }
  });
}
