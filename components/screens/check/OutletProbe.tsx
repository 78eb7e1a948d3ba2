import { useOutletProbe } from '@/components/queries/reviews';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import type { Review } from '@/shared/review/types';

interface Props {
  runId: number;
  review: Review;
  /** The item is not settled yet. */
  isOpen: boolean;
}

/** Offers, or follows, the second run that shows how far up the outlet condition is felt. */
export function OutletProbe({ runId, review, isOpen }: Props) {
  const ask = useOutletProbe(runId);
  const { outletProbe: probe, signOff } = review;
  const isMoving = probe?.state === 'queued' || probe?.state === 'running';
  const mayAsk = isOpen && !isMoving && signOff === null;
  return (
    <>
      {isMoving ? (
        <Txt variant="small" role="status">
          A second run with a changed outlet is under way; its effect is told here when it is done.
        </Txt>
      ) : null}
      {ask.error ? <ErrorState error={ask.error} title="The second run was not asked for" /> : null}
      {mayAsk ? (
        <Button
          label="Route it with a changed outlet"
          busy={ask.isPending}
          onPress={() => ask.mutate(undefined)}
        />
      ) : null}
    </>
  );
}
