import { shortTime } from '@/components/charts/geometry/timeWords';
import type { NoticeTone } from '@/components/ui/Notice';
import type { IssuedStation } from '@/shared/review/types';
import type { LevelResult } from '@/shared/runs/levelResult';
import { levelName } from '@/shared/studies/stationLevels';
import { formatClock, formatDuration, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';

/** A piece of a sentence; times stand out. */
export interface Words {
  text: string;
  strong?: boolean;
}

/** What the flood does at a place, in a sentence or two. */
export function floodSentence(station: IssuedStation, startsAt: string | null): Words[] {
  const { times, arrival, peakStageTime, leavesBanks, withinBanksAgain } = station;
  const span = times[times.length - 1] - times[0];
  const at = (t: number): Words[] => [
    { text: shortTime(t, span).replaceAll(' ', NO_BREAK), strong: true },
    ...(startsAt ? [{ text: ` (${formatClock(startsAt, t).replaceAll(' ', NO_BREAK)})` }] : []),
  ];
  const rises: Words[] =
    arrival === null
      ? [{ text: 'The flood hardly raises the water here; it stands highest at ' }]
      : [
          { text: 'The water starts to rise after ' },
          ...at(arrival),
          { text: ', stands highest at ' },
        ];
  const ends: Words[] = !leavesBanks
    ? [{ text: ', and stays within the banks.' }]
    : withinBanksAgain === null
      ? [{ text: ', and is still out of the banks when the computation ends.' }]
      : [{ text: ', and is back within the banks after ' }, ...at(withinBanksAgain), { text: '.' }];
  return [...rises, ...at(peakStageTime), ...ends];
}

/** A time and its unit stay on one line. */
const NO_BREAK = '\u00a0';

/** Classes from H3 up are dangerous to people; H1 is not said to be safe beyond the guideline's own words. */
export function hazardTone(label: string): NoticeTone {
  if (label >= 'H3') return 'danger';
  return label === 'H2' ? 'attention' : 'info';
}

/** The station that a chainage from an address names, else the nearest; m. */
export function nearestStation(
  stations: readonly IssuedStation[],
  at: number | null,
): IssuedStation | undefined {
  if (at === null) return stations[0];
  return [...stations].sort((a, b) => Math.abs(a.chainage - at) - Math.abs(b.chainage - at))[0];
}

/** How far the flood stays below a level, or by how much and for how long it passes it. */
export function freeboardSentence(result: LevelResult, span: number, system: UnitSystem): string {
  const { freeboard, level, passedAt, passedFor } = result;
  const name = `${levelName(result)} (${formatWithUnit(level, 'elevation', system)})`;
  const height = formatWithUnit(Math.abs(freeboard), 'depth', system);
  const words =
    passedAt === null
      ? `${name}: the computed flood stays ${height} below it.`
      : `${name}: the water passes it at ${shortTime(passedAt, span)}, stands up to ${height} above it, and for ${formatDuration(passedFor)} in all.`;
  return words;
}
