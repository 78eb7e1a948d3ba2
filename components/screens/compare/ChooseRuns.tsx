import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRuns } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { Checkbox } from '@/components/ui/Checkbox';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';
import { COMPARED_RUNS } from '@/shared/comparison/schemas';
import { toggled } from './runIds';

interface Props {
  chosen: readonly number[];
  onChange: (ids: number[]) => void;
}

/** Which runs stand side by side; the first that is chosen is the measure. */
export function ChooseRuns({ chosen, onChange }: Props) {
  const { study } = useCurrentStudy();
  const { data, error, refetch } = useRuns(study.id);
  const routed = (data ?? []).filter(({ state }) => state === 'routed');
  const isFull = chosen.length >= COMPARED_RUNS.max;
  return (
    <Card title="Runs to compare" aside={`${chosen.length} of ${COMPARED_RUNS.max} at most`}>
      {error && !data ? (
        <ErrorState error={error} title="The runs could not be read" retry={() => void refetch()} />
      ) : null}
      {data && routed.length < COMPARED_RUNS.min ? (
        <Txt tone="soft">
          There are not two routed runs yet. Route another scenario, or the same with a change.
        </Txt>
      ) : null}
      {routed.map(({ id, number, scenarioName, requestedAt }) => {
        const isChosen = chosen.includes(id);
        return (
          <Checkbox
            key={id}
            label={`Run ${number}, ${scenarioName}`}
            hint={`${wallClock(requestedAt)}${chosen[0] === id ? ' · the measure' : ''}`}
            checked={isChosen}
            disabled={!isChosen && isFull}
            onChange={() => onChange(toggled(chosen, id))}
          />
        );
      })}
    </Card>
  );
}
