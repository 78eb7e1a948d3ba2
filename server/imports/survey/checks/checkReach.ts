import { LIMITS } from '../../../../shared/limits';
import { showNumber } from '../../numbers/showNumber';
import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';
import { METRES_PER } from '../../headings/lengthUnits';

/** Nearer than this two sections are one place (m). */
const SAME_PLACE = 1e-3;
/** Longer than any river. */
const MAX_CHAINAGE_M = 1e7;

/** What only all sections together show: places taken twice, too few or too many of them, a bed that climbs downstream. */
export function checkReach(sections: RawSection[], faults: FaultList) {
  const { sections: most } = LIMITS.upload;
  const [first] = sections;
  if (sections.length > most)
    faults.fault(
      { sheet: sections[most].sheet, row: sections[most].firstRow },
      `The file has ${showNumber(sections.length)} sections`,
      `At most ${most} are taken. Split the reach, or leave sections out.`,
    );
  if (sections.length === 1)
    faults.fault(
      { sheet: first.sheet, row: first.firstRow, lastRow: first.lastRow },
      'Only one section was found',
      `All points stand under ${first.id}. A reach needs two sections or more.`,
    );
  for (const section of sections) {
    if (Math.abs(section.chainage ?? 0) > MAX_CHAINAGE_M)
      faults.fault(
        {
          sheet: section.sheet,
          row: section.firstRow,
          column: section.fields.get('chainage')?.column,
        },
        `Chainage ${section.chainageText} cannot be`,
        `Section ${section.id}. Is its unit right?`,
      );
  }
  checkTwins(sections, faults);
  // A slipped elevation may turn the bed; it is looked at when the rest is sound.
  if (!faults.refuses) doubtClimbingBed(sections, faults);
}

function checkTwins(sections: RawSection[], faults: FaultList) {
  const placed = sections
    .filter((section) => section.chainage !== null)
    .sort((a, b) => a.chainage! - b.chainage!);
  for (let i = 1; i < placed.length; i++) {
    const pair = [placed[i - 1], placed[i]];
    if (pair[1].chainage! - pair[0].chainage! > SAME_PLACE) continue;
    const [a, b] = pair.sort((p, q) => (p.sheet === q.sheet ? p.firstRow - q.firstRow : 0));
    const sameSheet = a.sheet === b.sheet;
    faults.fault(
      {
        sheet: sameSheet ? a.sheet : b.sheet,
        row: sameSheet ? a.firstRow : b.firstRow,
        lastRow: b.lastRow,
        column: b.fields.get('chainage')?.column,
      },
      `Chainage ${b.chainageText} stands twice`,
      `${a.id} and ${b.id}. Each section needs its own place on the reach.`,
    );
  }
}

/** Chainage from the mouth upwards turns the river round; a single pool does not. */
function doubtClimbingBed(sections: RawSection[], faults: FaultList) {
  const beds = sections.flatMap((section) => {
    const levels = section.points.flatMap(({ elevation }) =>
      isNumber(elevation) ? elevation : [],
    );
    if (section.chainage === null || levels.length === 0) return [];
    const metres = METRES_PER[section.fields.get('elevation')!.unit];
    const bed = levels.reduce((low, level) => Math.min(low, level), Infinity) * metres;
    return [{ x: section.chainage, z: bed }];
  });
  if (beds.length < 3) return;
  const mean = (pick: (p: { x: number; z: number }) => number) =>
    beds.reduce((sum, p) => sum + pick(p), 0) / beds.length;
  const [mx, mz] = [mean((p) => p.x), mean((p) => p.z)];
  const sxz = mean((p) => (p.x - mx) * (p.z - mz));
  const sxx = mean((p) => (p.x - mx) ** 2);
  const szz = mean((p) => (p.z - mz) ** 2);
  const correlation = sxz / Math.sqrt(sxx * szz);
  if (correlation > 0.6)
    faults.doubt(
      { sheet: sections[0].sheet, column: sections[0].fields.get('chainage')?.column },
      'The bed climbs as chainage grows',
      'Chainage grows downstream. If it was measured from the mouth upwards, count it the other way and send the file again.',
    );
}
