import { fromSi, type UnitSystem } from '@/shared/units/units';
import type { Frame } from './frame';
import { valueAt } from './interpolate';
import type { LongProfile } from './longProfile';
import type { Box } from './placeLabel';
import { textWidth } from './textWidth';

export interface StationName {
  name: string;
  box: Box;
}

const HEIGHT = 16;

/** Names that find a place in the ground left below their ring, clear of one another, the foot and the cursor. */
export function stationNames(
  stations: readonly { name: string; chainage: number }[],
  profile: LongProfile,
  frame: Frame,
  unitSystem: UnitSystem,
  fontSize: number,
): StationName[] {
  const placed: StationName[] = [];
  for (const { name, chainage } of stations) {
    const width = textWidth(name, fontSize);
    const x = frame.x(fromSi(chainage, 'chainage', unitSystem)) - width - 8;
    const bed = valueAt(profile.chainages, profile.bed, chainage);
    const top = frame.y(fromSi(bed, 'elevation', unitSystem)) + 8;
    const box = { x, y: top, width, height: HEIGHT };
    const hitsEdge = x < frame.left + 4 || top + HEIGHT > frame.bottom - 22;
    const hitsName = placed.some(
      ({ box: other }) => x < other.x + other.width + 8 && other.x < x + width + 8,
    );
    if (!hitsEdge && !hitsName) placed.push({ name, box });
  }
  return placed;
}
