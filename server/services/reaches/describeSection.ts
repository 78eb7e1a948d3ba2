import {
  bankfullStage,
  bankLevels,
  groundAt,
  thalwegOf,
} from '../../../shared/reaches/sectionGeometry';
import type { ReachSection } from '../../../shared/reaches/types';
import type { Section } from '../../../shared/surveys/types';
import { sectionProperties } from '../../solvers';

/** A section with what is told of it: levels, and its channel filled to the lower bank. Conveyance is 0 without roughness. */
export function describeSection(section: Section): ReachSection {
  const [leftBank, rightBank] = bankLevels(section);
  const stage = bankfullStage(section);
  const channel = channelOf(section);
  const hasRoughness = channel.roughness.length > 0;
  const { depth, topWidth, area, conveyance } = sectionProperties(
    hasRoughness ? channel : { ...channel, roughness: [[channel.points[0][0], 1]] },
    stage,
  );
  return {
    ...section,
    thalweg: thalwegOf(section),
    leftBank,
    rightBank,
    bankfull: { depth, topWidth, area, conveyance: hasRoughness ? conveyance : 0 },
  };
}

/** The part between the bank marks, cut where they stand; low ground behind a bank is no part of the channel. */
function channelOf({ id, chainage, points, roughness, banks }: Section) {
  if (!banks) return { id, chainage, points, roughness };
  const [left, right] = banks;
  const inside = points.filter(([y]) => y > left && y < right);
  const cut: [number, number][] = [
    [left, groundAt({ points }, left)],
    ...inside,
    [right, groundAt({ points }, right)],
  ];
  return { id, chainage, points: cut, roughness };
}
