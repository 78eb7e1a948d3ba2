import { isUnfinished } from '@/components/queries/runs';
import type { Run } from '@/shared/runs/types';
import { RunResults } from './results/RunResults';
import { RunGate } from './RunGate';
import { RunUnderWay } from './RunUnderWay';
import { StoppedRun } from './StoppedRun';

/** One run: while it computes, where it stopped, or what came out. */
export const RunScreen = () => <RunGate title="Run">{show}</RunGate>;

function show(run: Run) {
  if (isUnfinished(run)) return <RunUnderWay key={run.id} run={run} />;
  return run.state === 'routed' ? (
    <RunResults key={run.id} run={run} />
  ) : (
    <StoppedRun key={run.id} run={run} />
  );
}
