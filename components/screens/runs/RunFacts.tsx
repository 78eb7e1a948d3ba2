import { Card } from '@/components/ui/Card';
import type { Run } from '@/shared/runs/types';
import { formatDuration } from '@/shared/units/format';
import { Facts } from './Facts';
import { wallClock } from '@/components/ui/wallClock';

/** Who asked for the run, and what was frozen with it. */
export function RunFacts({ run }: { run: Run }) {
  const facts = [
    { name: 'Asked for by', value: `${run.requestedBy}, ${wallClock(run.requestedAt)}` },
    ...(run.finishedAt ? [{ name: 'Ended', value: wallClock(run.finishedAt) }] : []),
    { name: 'Length of the flood', value: formatDuration(run.duration) },
    ...(run.attempts > 1 ? [{ name: 'Times started', value: String(run.attempts) }] : []),
    { name: 'Solver', value: run.solverVersion },
    { name: 'Inputs', value: run.caseHash },
  ];
  return (
    <Card title="What was run">
      <Facts facts={facts} />
    </Card>
  );
}
