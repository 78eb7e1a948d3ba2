import { say, typed } from '../../../units/message';
import { join, type Faults } from '../faults';
import { checkCrest, checkNumber, checkWord, type Range } from './fields';

const REQUIRED = [
  'kind',
  'id',
  'chainage',
  'crest',
  'trigger',
  'mode',
  'growth',
  'formationTime',
  'bottomWidth',
  'bottomLevel',
  'sideSlope',
];
const OPTIONAL = ['centre', 'startLevel', 'weirCoefficient', 'orificeCoefficient'];

export function checkBreach(faults: Faults, path: string, value: unknown): void {
  if (!faults.record(path, value, REQUIRED, OPTIONAL)) return;
  const ends = checkCrest(faults, join(path, 'crest'), value.crest);
  checkTrigger(faults, join(path, 'trigger'), value.trigger);
  checkWord(faults, path, value, 'mode', ['overtopping', 'piping']);
  checkWord(faults, path, value, 'growth', ['linear', 'sine']);
  checkNumber(faults, path, value, 'formationTime', { what: 'a time in s', least: 0, most: 9.5e8 });
  const hasWidth = checkNumber(faults, path, value, 'bottomWidth', {
    what: 'a width',
    unit: 'length',
    above: 0,
  });
  const hasBottom = checkNumber(faults, path, value, 'bottomLevel', {
    what: 'a level',
    unit: 'elevation',
  });
  const slope = { what: 'a side slope (horizontal to vertical)', least: 0, most: 20 };
  checkNumber(faults, path, value, 'sideSlope', slope);
  checkNumber(faults, path, value, 'weirCoefficient', {
    what: 'C',
    unit: 'weirCoefficient',
    above: 0,
    most: 4,
  });
  checkNumber(faults, path, value, 'orificeCoefficient', {
    what: 'a coefficient',
    above: 0,
    most: 1,
  });
  const hasCentre = checkNumber(faults, path, value, 'centre', {
    what: 'an offset',
    unit: 'length',
  });
  const hasStart = checkNumber(faults, path, value, 'startLevel', {
    what: 'a level',
    unit: 'elevation',
  });

  if (value.mode === 'piping' && !('startLevel' in value)) {
    faults.add(join(path, 'startLevel'), 'is missing; a pipe begins at a level of its own');
  }
  if (hasStart && hasBottom && (value.startLevel as number) < (value.bottomLevel as number)) {
    faults.add(
      join(path, 'startLevel'),
      say`${typed(value.startLevel as number, 'elevation')} lies below the bottom of the full breach; a breach only grows down`,
    );
  }
  if (!ends) return;
  const centre = hasCentre ? (value.centre as number) : 0.5 * (ends[0] + ends[1]);
  if (centre < ends[0] || centre > ends[1]) {
    faults.add(
      join(path, 'centre'),
      say`${typed(centre, 'length')} lies outside the crest, ${typed(ends[0], 'length')} to ${typed(ends[1], 'length')}`,
    );
  } else if (hasWidth) {
    const half = 0.5 * (value.bottomWidth as number);
    // Rounding of the middle of a crest is no fault.
    const slack = 1e-9 * (ends[1] - ends[0]);
    if (centre - half < ends[0] - slack || centre + half > ends[1] + slack) {
      faults.add(
        join(path, 'bottomWidth'),
        say`${typed(value.bottomWidth as number, 'length')} about offset ${typed(centre, 'length')} reaches beyond the crest, ${typed(ends[0], 'length')} to ${typed(ends[1], 'length')}; mend one of them`,
      );
    }
  }
  const points = value.crest as [number, number][];
  const top = Math.max(...points.map(([, level]) => level));
  for (const key of ['startLevel', 'bottomLevel']) {
    const level = value[key];
    if (typeof level !== 'number' || level <= top) continue;
    faults.add(
      join(path, key),
      say`${typed(level, 'elevation')} lies above the crest, whose highest point is at ${typed(top, 'elevation')}`,
    );
  }
}

function checkTrigger(faults: Faults, path: string, value: unknown): void {
  if (value === undefined) return;
  const kind = faults.kind(path, value, ['time', 'stage']);
  if (kind === null || !faults.record(path, value, ['kind', kind])) return;
  const range: Range =
    kind === 'time'
      ? { what: 'a time in s', least: 0, most: 9.5e8 }
      : { what: 'a stage', unit: 'elevation' };
  checkNumber(faults, path, value, kind, range);
}
