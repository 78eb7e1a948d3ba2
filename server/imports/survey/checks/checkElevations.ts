import { METRES_PER } from '../../headings/lengthUnits';
import { showNumber } from '../../numbers/showNumber';
import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';

/** A gap of this many metres, and of this many times the range of the rest, sets a point apart. */
const GAP_M = 10;
const GAP_RANGES = 3;
/** Beyond these no ground is believed: the file is refused instead of doubted. */
const FAULT_M = 50;
const FAULT_RANGES = 10;
/** Digits slip by a factor of ten or a hundred; thousands marks by a thousand. */
const SLIPS = [10, 100, 1000];

/** Points far above or below the rest of their section: a slipped decimal point, a target's height, another datum. */
export function checkElevations(section: RawSection, faults: FaultList) {
  const { column, unit } = section.fields.get('elevation')!;
  const points = section.points.filter((point) => isNumber(point.elevation));
  if (points.length < 4) return;
  const metres = METRES_PER[unit];
  const sorted = Float64Array.from(points, (point) => point.elevation as number).sort();
  const { low, high } = mainBody(sorted, GAP_M / metres);
  for (const point of points) {
    const value = point.elevation as number;
    if (value >= low && value <= high) continue;
    const away = value > high ? value - high : low - value;
    const slip = SLIPS.some(
      (factor) => within(value / factor, low, high) || within(value * factor, low, high),
    );
    const beyond = away * metres > FAULT_M && away > FAULT_RANGES * (high - low);
    const place = { sheet: section.sheet, row: point.row, column };
    const title = `Elevation ${showNumber(value)} is far from the rest`;
    const rest = `Section ${section.id} lies between ${showNumber(low)} and ${showNumber(high)}.`;
    if (slip) faults.fault(place, title, `${rest} A decimal point missing or slipped?`);
    else if (beyond) faults.fault(place, title, `${rest} Write the elevation of the ground.`);
    else faults.doubt(place, title, `${rest} Keep it if the ground is so.`);
  }
}

const within = (value: number, low: number, high: number) => {
  const margin = 0.5 * (high - low) + 1;
  return value >= low - margin && value <= high + margin;
};

/** Grows from the median outwards until a gap is too wide. */
function mainBody(sorted: Float64Array, gap: number): { low: number; high: number } {
  let from = sorted.length >> 1;
  let to = from;
  for (;;) {
    const allowed = Math.max(gap, GAP_RANGES * (sorted[to] - sorted[from]));
    const down = from > 0 ? sorted[from] - sorted[from - 1] : Infinity;
    const up = to < sorted.length - 1 ? sorted[to + 1] - sorted[to] : Infinity;
    if (Math.min(down, up) > allowed) return { low: sorted[from], high: sorted[to] };
    if (down <= up) from--;
    else to++;
  }
}
