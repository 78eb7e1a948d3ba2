import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { CAUTIONS } from '@/shared/runs/cautions';

/** Stands wherever a result can be read. */
export function Cautions() {
  return (
    <Notice tone="info" title="What this result is, and is not" still>
      {CAUTIONS.map((caution) => (
        <Txt key={caution} variant="small">
          {caution}
        </Txt>
      ))}
    </Notice>
  );
}
