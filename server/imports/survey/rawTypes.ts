import type { SurveyField } from '../../../shared/surveys/types';
import type { FieldColumn } from './matchSheet';

/** A cell that should hold a number and does not, as it stands in the file. */
export interface BadCell {
  bad: string;
}
/** In the unit of its column; null: blank. */
export type NumberCell = number | null | BadCell;

export const isNumber = (cell: NumberCell): cell is number => typeof cell === 'number';
export const isBad = (cell: NumberCell): cell is BadCell =>
  typeof cell === 'object' && cell !== null;

/** One surveyed point as it was read; nothing checked yet. */
export interface RawPoint {
  /** 0-based. */
  row: number;
  offset: NumberCell;
  elevation: NumberCell;
  roughness: NumberCell;
  easting: NumberCell;
  northing: NumberCell;
  /** Trimmed; empty where there is none. */
  bank: string;
}

/** The points that stand under one section. */
export interface RawSection {
  id: string;
  sheet: string;
  fields: Map<SurveyField, FieldColumn>;
  /** 0-based. */
  firstRow: number;
  lastRow: number;
  /** m; null: missing or faulty, which has been said. */
  chainage: number | null;
  /** As the file has it, for sentences. */
  chainageText: string;
  points: RawPoint[];
}
