import { useCurrentStudy } from '@/components/layout/studyContext';
import { useTaskSets } from '@/components/queries/tasks';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { TASK_STATE_WORDS } from '@/shared/tasks/types';

/** Searches for roughness of the study, newest first. */
export function SearchesCard() {
  const { study } = useCurrentStudy();
  const sets = useTaskSets(study.id).data;
  const data = sets?.filter(({ kind }) => kind === 'calibration');
  return (
    <Card title="Searches for roughness">
      {data?.length === 0 ? (
        <Txt tone="soft">
          None yet. Open a run against the observations and search from there: it proposes
          multipliers and never applies them.
        </Txt>
      ) : null}
      {data?.length ? (
        <List label="Searches">
          {data.map(({ id, name, state, runNumber }) => (
            <Button
              key={id}
              kind="quiet"
              label={`${name}, ${runNumber === null ? '' : `run ${runNumber}, `}${TASK_STATE_WORDS[state].toLowerCase()}`}
              href={`/studies/${study.id}/calibration/searches/${id}`}
            />
          ))}
        </List>
      ) : null}
    </Card>
  );
}
