import { DataTypes, type CreationOptional, type ModelAttributes } from 'sequelize';
import { sayIn, type MessagePart, type Said } from '../../shared/units/message';
import type { UnitSystem } from '../../shared/units/units';
import { jsonColumn } from '../database/jsonColumn';

/** Why a computation gave nothing: the words in SI, and what they are put together from where that was kept. */
export interface FailureFields {
  failure: CreationOptional<string | null>;
  failureParts: CreationOptional<MessagePart[] | null>;
}

export const failureColumns = () =>
  ({
    failure: DataTypes.TEXT,
    failureParts: jsonColumn<MessagePart[]>('failureParts', true),
  }) satisfies ModelAttributes;

/** Both columns, to be written together. */
export const failureFields = (said: Said | null) => ({
  failure: said?.message ?? null,
  failureParts: said?.parts ?? null,
});

/** The words as they are stored; null where nothing failed. */
export const failureSaid = ({
  failure,
  failureParts,
}: {
  failure: string | null;
  failureParts: MessagePart[] | null;
}): Said | null =>
  failure ? { message: failure, ...(failureParts && { parts: failureParts }) } : null;

/** The same as a study in these units reads it. */
export const failureIn = (
  system: UnitSystem,
  row: Parameters<typeof failureSaid>[0],
): string | null => {
  const said = failureSaid(row);
  return said && sayIn(system, said);
};
