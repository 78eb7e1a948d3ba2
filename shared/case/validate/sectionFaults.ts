import { say, typed, unitOf } from '../../units/message';
import { CASE_LIMITS } from '../caseLimits';
import { join, type Faults } from './faults';
import { checkMetres } from './metres';
import { checkEmbankments, checkStorage } from './sectionPartFaults';

/** Two or more sections, chainage strictly increasing, ids unique. */
export function checkSections(faults: Faults, value: unknown): void {
  if (!faults.array('sections', value, 2, CASE_LIMITS.sections)) return;
  const ids = new Map<string, number>();
  let before: { chainage: number; index: number } | null = null;
  value.forEach((section, index) => {
    const path = `sections[${index}]`;
    checkSection(faults, path, section);
    if (typeof section !== 'object' || section === null) return;
    const { id, chainage } = section as { id?: unknown; chainage?: unknown };
    if (typeof id === 'string') {
      const first = ids.get(id);
      if (first !== undefined) {
        faults.add(
          join(path, 'id'),
          `"${id}" is also the id of sections[${first}]; make it unique`,
        );
      } else ids.set(id, index);
    }
    if (typeof chainage === 'number' && Number.isFinite(chainage)) {
      if (before && chainage <= before.chainage) {
        faults.add(
          join(path, 'chainage'),
          say`is ${typed(chainage, 'chainage')}, not beyond the ${typed(before.chainage, 'chainage')} of sections[${before.index}]; order the sections downstream, each at a chainage of its own`,
        );
      }
      before = { chainage, index };
    }
  });
}

function checkSection(faults: Faults, path: string, value: unknown): void {
  const required = ['id', 'chainage', 'points', 'roughness'];
  if (!faults.record(path, value, required, ['banks', 'storage', 'embankments'])) return;
  if ('id' in value && faults.text(join(path, 'id'), value.id, 100) && value.id === '') {
    faults.add(join(path, 'id'), 'is empty; name the section');
  }
  if ('chainage' in value)
    checkMetres(faults, join(path, 'chainage'), value.chainage, 'a chainage');
  const points = 'points' in value ? checkPoints(faults, join(path, 'points'), value.points) : null;
  const ends: Ends = points ? [points[0][0], points[points.length - 1][0]] : null;
  if ('roughness' in value) checkRoughness(faults, join(path, 'roughness'), value.roughness, ends);
  const banks =
    value.banks === undefined ? null : checkBanks(faults, join(path, 'banks'), value.banks, ends);
  const ground = { points, banks };
  if (value.storage !== undefined) {
    checkStorage(faults, join(path, 'storage'), value.storage, ground, value.embankments);
  }
  if (value.embankments !== undefined) {
    checkEmbankments(faults, join(path, 'embankments'), value.embankments, ground);
  }
}

/** First and last offset, where the points can be used. */
type Ends = [number, number] | null;

/** The points, where they can be used. */
function checkPoints(faults: Faults, path: string, value: unknown): [number, number][] | null {
  if (!faults.array(path, value, 2, CASE_LIMITS.pointsPerSection)) return null;
  const count = faults.list.length;
  const points: [number, number][] = [];
  value.forEach((point, k) => {
    const at = `${path}[${k}]`;
    if (!isPair(point)) {
      faults.add(at, say`must be [offset, elevation], two numbers in ${unitOf('length')}`);
      return;
    }
    const fine =
      checkMetres(faults, `${at}[0]`, point[0], 'an offset') &&
      checkMetres(faults, `${at}[1]`, point[1], 'an elevation');
    if (!fine) return;
    const before = points[points.length - 1];
    if (before && (point[0] as number) < before[0]) {
      faults.add(
        at,
        say`its offset ${typed(point[0] as number, 'length')} lies left of the ${typed(before[0], 'length')} before it; order the points from left to right`,
      );
    }
    points.push([point[0] as number, point[1] as number]);
  });
  if (faults.list.length > count) return null;
  const last = points.length - 1;
  if (points[last][0] <= points[0][0]) {
    faults.add(
      path,
      'all points have the same offset, so the section has no width; give its true offsets',
    );
    return null;
  }
  const inner = points.findIndex(([offset]) => offset > points[0][0]) - 1;
  if (points[inner][1] > points[0][1]) {
    faults.add(
      `${path}[0]`,
      'starts a wall that rises into the section; begin at the top of the wall',
    );
  }
  const outer = points.findIndex(([offset]) => offset === points[last][0]);
  if (points[outer][1] > points[last][1]) {
    faults.add(
      `${path}[${last}]`,
      'ends a wall that falls out of the section; end at the top of the wall',
    );
  }
  return points;
}

function checkRoughness(faults: Faults, path: string, value: unknown, ends: Ends): void {
  if (!faults.array(path, value, 1, CASE_LIMITS.roughnessZonesPerSection)) return;
  let before: number | null = null;
  value.forEach((zone, k) => {
    const at = `${path}[${k}]`;
    if (!isPair(zone)) {
      faults.add(at, 'must be [from offset, Manning n], two numbers');
      return;
    }
    const [from, n] = zone;
    if (faults.number(`${at}[1]`, n, "Manning's n")) {
      if (n < 0)
        faults.add(`${at}[1]`, `Manning's n is ${n}; it cannot be negative (rivers: 0.02 to 0.15)`);
      if (n > 10)
        faults.add(`${at}[1]`, `Manning's n is ${n}; it must be below 10 (rivers: 0.02 to 0.15)`);
    }
    if (!checkMetres(faults, `${at}[0]`, from, 'an offset')) return;
    const offset = from as number;
    if (before !== null && offset <= before) {
      faults.add(
        `${at}[0]`,
        say`offset ${typed(offset, 'length')} does not lie right of the ${typed(before, 'length')} before it; order the zones`,
      );
    }
    if (k === 0 && ends && offset > ends[0]) {
      faults.add(
        `${at}[0]`,
        say`the first zone begins at ${typed(offset, 'length')}, right of the first point at ${typed(ends[0], 'length')}; begin it there`,
      );
    }
    if (ends && offset > ends[1]) {
      faults.add(
        `${at}[0]`,
        say`offset ${typed(offset, 'length')} lies right of the last point at ${typed(ends[1], 'length')}; remove the zone`,
      );
    }
    before = offset;
  });
}

function checkBanks(faults: Faults, path: string, value: unknown, ends: Ends): Ends {
  if (!isPair(value)) {
    faults.add(
      path,
      say`must be [left bank offset, right bank offset], two numbers in ${unitOf('length')}`,
    );
    return null;
  }
  const fine =
    checkMetres(faults, `${path}[0]`, value[0], 'an offset') &&
    checkMetres(faults, `${path}[1]`, value[1], 'an offset');
  if (!fine) return null;
  const [left, right] = value as [number, number];
  if (left >= right) {
    faults.add(
      path,
      say`the left bank at ${typed(left, 'length')} does not lie left of the right bank at ${typed(right, 'length')}; swap or mend them`,
    );
  }
  if (ends && (left < ends[0] || right > ends[1])) {
    faults.add(
      path,
      say`the banks at ${typed(left, 'length')} and ${typed(right, 'length')} must lie within the section, ${typed(ends[0], 'length')} to ${typed(ends[1], 'length')}`,
    );
  }
  return [left, right];
}

function isPair(value: unknown): value is [unknown, unknown] {
  return Array.isArray(value) && value.length === 2;
}
