import type { Section } from '../../surveys/types';
import { areaBelow, lowestIndex, topWidthAt } from '../sectionGeometry';

/** Stages below this share of the height of the lower end over the lowest point are passed over: a rough bed is no bank. */
const LEAST_HEIGHT = 0.25;
/** Once the ratio has grown this far beyond its least, the water is out of the channel. */
const OUT_OF_BANK = 1.2;

export interface BankProposal {
  banks: [number, number];
  /** m. */
  stage: number;
}

/**
 * Bank marks where the ratio of width to mean depth, T²/A, is least as the water rises from the lowest point: Wolman, M.G.
 * (1955), The natural channel of Brandywine Creek, Pennsylvania, US Geological Survey Professional Paper 271 [memory].
 * Only the water that joins the lowest point counts; stages are tried at the elevations of the points. The marks stand on the
 * first points at or above that stage on either side. null where there is no such stage.
 */
export function proposeBanks(section: Section): BankProposal | null {
  const { points } = section;
  const low = lowestIndex(section);
  const bed = points[low][1];
  const top = Math.min(highest(points.slice(0, low + 1)), highest(points.slice(low)));
  const stages = [...new Set(points.map(([, z]) => z))]
    .filter((z) => z <= top && z >= bed + LEAST_HEIGHT * (top - bed) && z > bed)
    .sort((a, b) => a - b);
  let best: BankProposal | null = null;
  let least = Infinity;
  for (const stage of stages) {
    const span = [shore(section, low, stage, -1), shore(section, low, stage, 1)] as const;
    const ends = [points[span[0]][0], points[span[1]][0]] as [number, number];
    const width = topWidthAt(section, stage, ends);
    const ratio = (width * width) / areaBelow(section, stage, ends);
    if (ratio < least) [least, best] = [ratio, { banks: ends, stage }];
    else if (ratio > OUT_OF_BANK * least) break;
  }
  // The last stage of all has nothing above it to compare with: the channel has no banks that could be told.
  return best && best.stage < top && best.banks[0] < best.banks[1] ? best : null;
}

const highest = (points: Section['points']) => Math.max(...points.map(([, z]) => z));

/** The first point outwards from the lowest that is not under water. */
function shore({ points }: Section, low: number, stage: number, step: 1 | -1): number {
  let i = low;
  while (points[i + step] && points[i][1] < stage) i += step;
  return i;
}
