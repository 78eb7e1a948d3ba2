import type { StationLevel } from '../studies/stationLevels';
import { firstAbove, timeAbove } from './crossings';

/** What the flood does to a level at a station. SI; times in s from start. */
export interface LevelResult extends StationLevel {
  stationId: number;
  /** Of the station. */
  name: string;
  chainage: number;
  /** Of every time step. */
  peakStage: number;
  /** Level less peak stage; below 0 the water passes it. */
  freeboard: number;
  /** When the water first passes it; null: never. */
  passedAt: number | null;
  /** How long it stands above it in all. */
  passedFor: number;
}

/** The stage at a station: its peak of every step, and the stored moments. */
export interface StageAt {
  times: ArrayLike<number>;
  stage: ArrayLike<number>;
  peakStage: number;
  peakStageTime: number;
}

/** Freeboard from the exact peak; times from the stored moments, linear between them. */
export function levelResult(
  station: { id: number; name: string; chainage: number },
  { kind, level, note }: StationLevel,
  { times, stage, peakStage, peakStageTime }: StageAt,
): LevelResult {
  const freeboard = level - peakStage;
  // A peak between two stored moments can pass a level that none of them shows.
  const passedAt = freeboard < 0 ? (firstAbove(times, stage, level) ?? peakStageTime) : null;
  return {
    stationId: station.id,
    name: station.name,
    chainage: station.chainage,
    kind,
    level,
    note,
    peakStage,
    freeboard,
    passedAt,
    passedFor: passedAt === null ? 0 : timeAbove(times, stage, level),
  };
}
