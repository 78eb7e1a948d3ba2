import { showNumber } from '../../numbers/showNumber';
import type { FaultList } from '../FaultList';
import { isBad, isNumber, type RawSection } from '../rawTypes';

/** Smoother than glass, rougher than any timber: outside of it the cell is hardly a Manning's n (Chow 1959, table 5-6). */
const USUAL = { min: 0.008, max: 0.25 };

/** Manning's n above 0 and not above 1; blank cells carry on from the point before. */
export function checkRoughness(section: RawSection, faults: FaultList) {
  const field = section.fields.get('roughness');
  if (!field) return;
  let doubted = false;
  for (const { row, roughness } of section.points) {
    const place = { sheet: section.sheet, row, column: field.column };
    const where = `Section ${section.id}.`;
    if (isBad(roughness))
      faults.fault(
        place,
        `Manning's n is not a number: ${roughness.bad}`,
        `${where} Write a number, like 0.035, or leave the cell blank.`,
      );
    else if (isNumber(roughness) && (roughness <= 0 || roughness > 1))
      faults.fault(
        place,
        `Manning's n of ${showNumber(roughness)} cannot be`,
        `${where} ${roughness > 1 ? `A Strickler value? Manning's n is 1 over it.` : 'It is above 0.'} Natural channels lie between 0.025 and 0.15.`,
      );
    else if (isNumber(roughness) && !doubted && (roughness < USUAL.min || roughness > USUAL.max)) {
      doubted = true;
      faults.doubt(
        place,
        `Manning's n of ${showNumber(roughness)} is unusual`,
        `${where} Published values lie between 0.011 and 0.2.`,
      );
    }
  }
}
