import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRuns } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';

const SHOWN = 12;

/** The way to a run against the observations. */
export function RunsAgainstCard() {
  const { study } = useCurrentStudy();
  const { data } = useRuns(study.id);
  const routed = (data ?? []).filter(({ state }) => state === 'routed');
  return (
    <Card title="Runs against them">
      {data && routed.length === 0 ? (
        <Txt tone="soft">No run is routed yet. Route the flood that left these marks.</Txt>
      ) : null}
      {routed.length > 0 ? (
        <List label="Runs against the observations">
          {routed.slice(0, SHOWN).map(({ id, number, scenarioName }) => (
            <Button
              key={id}
              kind="quiet"
              label={`Run ${number}, ${scenarioName}`}
              href={`/studies/${study.id}/calibration/runs/${id}`}
            />
          ))}
        </List>
      ) : null}
    </Card>
  );
}
