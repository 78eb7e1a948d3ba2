import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunSummary } from '@/shared/runs/types';
import { Facts } from '../Facts';
import { CLOSED, volumeLines, volumeSentence } from './volumeWords';

/** Whether water was lost or made on the way. */
export function VolumeCard({ summary }: { summary: RunSummary }) {
  const unitSystem = useUnitSystem();
  const closes = Math.abs(summary.volume.relativeError) <= CLOSED;
  return (
    <Card title="Volume balance">
      {closes ? (
        <Txt>{volumeSentence(summary)}</Txt>
      ) : (
        <Notice tone="attention" still>
          {volumeSentence(summary)}
        </Notice>
      )}
      <Facts facts={volumeLines(summary, unitSystem)} />
    </Card>
  );
}
