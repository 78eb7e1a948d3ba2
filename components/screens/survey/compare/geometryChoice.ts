import type { ReachRow } from '@/shared/reaches/types';
import type { SurveyRevisionRow } from '@/shared/surveys/types';

/** A geometry as it stands in the address: `survey-3`, `reach-5`. */
export interface GeometryKey {
  kind: 'survey' | 'reach';
  id: number;
}

export function parseKey(text: string | undefined): GeometryKey | null {
  const found = /^(survey|reach)-(\d+)$/.exec(text ?? '');
  return found && { kind: found[1] as GeometryKey['kind'], id: Number(found[2]) };
}

export const keyText = ({ kind, id }: GeometryKey): string => `${kind}-${id}`;

/** Everything that can be compared, oldest survey first; reaches of surveys differ from them in banks and roughness alone. */
export const geometryOptions = (
  revisions: readonly SurveyRevisionRow[],
  reaches: readonly ReachRow[],
) => [
  ...[...revisions]
    .sort((a, b) => a.revision - b.revision)
    .map(({ id, revision }) => ({
      value: keyText({ kind: 'survey', id }),
      label: `Survey, revision ${revision}`,
    })),
  ...[...reaches]
    .sort((a, b) => a.id - b.id)
    .map(({ id, name, copiedFrom }) => ({
      value: keyText({ kind: 'reach', id }),
      label: copiedFrom === null ? `Reach of ${name.toLowerCase()}` : `Geometry ${name}`,
    })),
];
