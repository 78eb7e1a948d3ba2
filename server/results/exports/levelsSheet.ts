import type { LevelResult } from '../../../shared/runs/levelResult';
import { levelName } from '../../../shared/studies/stationLevels';
import type { UnitSystem } from '../../../shared/units/units';
import { EXPORT_UNITS } from './exportUnits';

const HOUR = 3600;

/** Freeboard of the levels at the stations, and when and how long the water passes them. */
export function levelsSheet(levels: LevelResult[], system: UnitSystem) {
  const { length } = EXPORT_UNITS[system];
  const m = length.symbol;
  return [
    [
      'Station',
      `Chainage (${m})`,
      'Level of',
      `Level (${m})`,
      `Peak stage (${m})`,
      `Freeboard (${m})`,
      'Passed at (h)',
      'Passed for (h)',
    ],
    ...levels.map((result) => [
      result.name,
      result.chainage / length.si,
      levelName(result),
      result.level / length.si,
      result.peakStage / length.si,
      result.freeboard / length.si,
      result.passedAt === null ? null : result.passedAt / HOUR,
      result.passedAt === null ? null : result.passedFor / HOUR,
    ]),
  ];
}
