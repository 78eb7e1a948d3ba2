/** What a level at a station is of, and the words for it. */
export const LEVEL_KINDS = {
  soffit: 'Bridge soffit',
  floor: 'House floor',
  road: 'Road level',
  bank: 'Bank crest',
  other: 'Other level',
} as const;
export type LevelKind = keyof typeof LEVEL_KINDS;

/** A level that the water is held against: how far below it the flood stays, or when it is passed. */
export interface StationLevel {
  kind: LevelKind;
  /** m above datum. */
  level: number;
  /** Which one, e.g. `Mill Lane 4`; may be empty. */
  note: string;
}

/** Its name in tables and drawings. */
export const levelName = ({ kind, note }: Pick<StationLevel, 'kind' | 'note'>): string => {
  if (!note) return LEVEL_KINDS[kind];
  return kind === 'other' ? note : `${LEVEL_KINDS[kind]}, ${note}`;
};
