import { useState } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { useRunStructure } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SelectField } from '@/components/ui/SelectField';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary } from '@/shared/runs/types';
import { STRUCTURE_NAMES } from '@/shared/structures/structureWords';
import { formatWithUnit } from '@/shared/units/format';
import { RegimesOf } from './RegimesOf';
import { StructureCurves } from './StructureCurves';
import { StructureNow } from './StructureNow';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** What passes each structure, one at a time. */
export function StructuresCard({ run, summary, store }: Props) {
  const { structures, times } = summary;
  const system = useUnitSystem();
  const [chosen, choose] = useState(0);
  const structure = structures[chosen];
  const { data: series, error, refetch } = useRunStructure(run.id, chosen + 1);
  const nameOf = ({ id, kind, chainage }: typeof structure) =>
    `${id}, ${STRUCTURE_NAMES[kind].toLowerCase()} at ${formatWithUnit(chainage, 'chainage', system)}`;
  return (
    <Card
      title="Structures"
      aside={
        <Button
          kind="quiet"
          label="Show on the reach"
          name={`Show on the reach: ${structure.id}`}
          onPress={() => store.setAt(structure.chainage)}
        />
      }
    >
      {structures.length > 1 ? (
        <SelectField
          label="Structure"
          value={String(chosen)}
          options={structures.map((one, i) => ({ value: String(i), label: nameOf(one) }))}
          onChange={(value) => choose(Number(value))}
        />
      ) : null}
      <StructureNow
        {...{ run, structure, store }}
        title={structures.length > 1 ? null : nameOf(structure)}
        series={series ?? null}
        span={times.end - times.start}
      />
      {series ? (
        <StructureCurves {...{ structure, series, store }} startsAt={run.startsAt} />
      ) : error ? (
        <ErrorState
          error={error}
          title="The values of this structure could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading the values of this structure…" />
      )}
      <RegimesOf structure={structure} store={store} span={times.end - times.start} />
    </Card>
  );
}
