import { Cautions } from '@/components/layout/Cautions';
import { formatDay } from '@/components/ui/formatDay';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { IssuedResult } from '@/shared/review/types';

interface Props {
  result: IssuedResult;
  withdrawn: NonNullable<IssuedResult['withdrawn']>;
}

/** Figures that nobody may rely on are not shown: the report keeps them, marked on every page. */
export function IssuedWithdrawn({ result, withdrawn }: Props) {
  return (
    <>
      <Notice
        tone="danger"
        title={`Withdrawn on ${formatDay(withdrawn.at)}: do not rely on this result`}
        still
      >
        <Txt>{withdrawn.reason}</Txt>
        <Txt variant="small">
          {`It was signed on ${formatDay(result.signedAt)} by ${result.signedBy}. Its figures are no longer shown here; the report keeps them, marked WITHDRAWN. Ask the firm what follows for decisions that were taken on it.`}
        </Txt>
      </Notice>
      <Cautions />
    </>
  );
}
