import { say, typed } from '../../units/message';
import { CASE_LIMITS } from '../caseLimits';
import type { ReachEnds } from './boundaryFaults';
import { join, type Faults } from './faults';
import { checkSeries } from './seriesFaults';

const PARTS = ['all', 'channel', 'overbank'];
/** Factors beyond these are no calibration but a slip of the pen. */
const LEAST_FACTOR = 0.1;
const MOST_FACTOR = 10;

/** Manning's n by stretch and depth. */
export function checkRoughnessFactors(faults: Faults, value: unknown, ends: ReachEnds): void {
  if (!faults.array('roughnessFactors', value, 0, CASE_LIMITS.roughnessFactors)) return;
  value.forEach((entry, k) => {
    const path = `roughnessFactors[${k}]`;
    if (!faults.record(path, entry, ['from', 'to', 'part', 'depths', 'factors'])) return;
    checkStretch(faults, path, entry, ends);
    if ('part' in entry && !PARTS.includes(entry.part as string)) {
      faults.add(join(path, 'part'), `must be one of ${PARTS.join(', ')}`);
    }
    const { depths, factors } = entry;
    if (Array.isArray(depths) && depths.length > CASE_LIMITS.factorDepths) {
      faults.add(
        join(path, 'depths'),
        `has ${depths.length} entries; at most ${CASE_LIMITS.factorDepths} are allowed`,
      );
      return;
    }
    checkSeries(faults, path, entry, {
      at: 'depths',
      values: ['factors'],
      notNegative: ['depths'],
    });
    if (!Array.isArray(factors)) return;
    factors.forEach((factor: unknown, m) => {
      if (typeof factor !== 'number' || !Number.isFinite(factor)) return;
      if (factor >= LEAST_FACTOR && factor <= MOST_FACTOR) return;
      faults.add(
        `${join(path, 'factors')}[${m}]`,
        `is ${factor}; a factor of Manning's n lies between ${LEAST_FACTOR} and ${MOST_FACTOR}`,
      );
    });
  });
}

/** Losses at contractions and expansions by stretch. */
export function checkLocalLosses(faults: Faults, value: unknown, ends: ReachEnds): void {
  if (!faults.array('localLosses', value, 0, CASE_LIMITS.localLosses)) return;
  value.forEach((entry, k) => {
    const path = `localLosses[${k}]`;
    if (!faults.record(path, entry, ['from', 'to', 'contraction', 'expansion'])) return;
    checkStretch(faults, path, entry, ends);
    for (const key of ['contraction', 'expansion']) {
      const at = join(path, key);
      if (!(key in entry) || !faults.number(at, entry[key], 'a loss coefficient')) continue;
      const given = entry[key];
      if (given < 0 || given > 1) {
        faults.add(
          at,
          `is ${given}; it is the lost share of the change of velocity head, 0 to 1 (gradual: 0.1 and 0.3)`,
        );
      }
    }
  });
}

function checkStretch(
  faults: Faults,
  path: string,
  entry: Record<string, unknown>,
  ends: ReachEnds,
): void {
  const places = (['from', 'to'] as const).filter((key) => {
    if (!(key in entry)) return false;
    const at = entry[key];
    if (!faults.number(join(path, key), at, 'a chainage', 'chainage')) return false;
    if (!ends || (at >= ends[0] && at <= ends[1])) return true;
    return faults.add(
      join(path, key),
      say`chainage ${typed(at, 'chainage')} lies outside the reach, ${typed(ends[0], 'chainage')} to ${typed(ends[1], 'chainage')}`,
    );
  });
  if (places.length === 2 && (entry.from as number) >= (entry.to as number)) {
    faults.add(
      path,
      say`from ${typed(entry.from as number, 'chainage')} does not lie above to ${typed(entry.to as number, 'chainage')}; swap or mend them`,
    );
  }
}
