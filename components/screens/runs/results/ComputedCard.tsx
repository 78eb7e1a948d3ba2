import { Card } from '@/components/ui/Card';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary } from '@/shared/runs/types';
import { formatDuration, formatNumber, formatChosenLength } from '@/shared/units/format';
import { Facts } from '../Facts';
import { wallClock } from '@/components/ui/wallClock';
import { tookWords } from '../runWords';

/** How the result came about, and the hash that names its inputs. */
export function ComputedCard({ run, summary }: { run: Run; summary: RunSummary }) {
  const system = useUnitSystem();
  const { cellCount, cellSize, steps, seconds, times } = summary;
  const facts = [
    { name: 'Asked for by', value: `${run.requestedBy}, ${wallClock(run.requestedAt)}` },
    { name: 'Length of the flood', value: formatDuration(run.duration) },
    {
      name: 'Grid',
      value: `${formatNumber(cellCount, 0)} cells of ${formatChosenLength(cellSize, system)}`,
    },
    {
      name: 'Steps',
      value: `${formatNumber(steps, 0)}, ${formatNumber(times.count, 0)} output times`,
    },
    { name: 'Computed in', value: tookWords(seconds) },
    { name: 'Solver', value: run.solverVersion },
    { name: 'Inputs', value: run.caseHash },
  ];
  return (
    <Card title="How it was computed">
      <Facts facts={facts} />
      <LinkTxt href={`/studies/${run.studyId}/confidence?run=${run.id}`}>
        How far these numbers carry
      </LinkTxt>
    </Card>
  );
}
