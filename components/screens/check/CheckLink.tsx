import { useMe } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import type { Run } from '@/shared/runs/types';
import { checkLabel } from './reviewWords';

/** From the results of a run to its check: what to do next. A run that only tries an outlet has none. */
export function CheckLink({ run }: { run: Run }) {
  const { roles } = useMe();
  if (run.triesOutlet) return null;
  return (
    <Button
      kind="solid"
      label={checkLabel(run.review, roles)}
      href={`/studies/${run.studyId}/runs/${run.id}/check`}
    />
  );
}
