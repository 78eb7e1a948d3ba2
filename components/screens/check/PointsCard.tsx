import { useState } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import type { Review } from '@/shared/review/types';
import type { Run, RunSummary } from '@/shared/runs/types';
import { PointLine } from './PointLine';
import { pointNumbers } from './raisedPoints';
import { RaisePoint } from './RaisePoint';
import { sortPoints } from './reviewWords';
import { usePointOfAddress } from './usePointOfAddress';

interface Props {
  run: Run;
  review: Review;
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** The discussion of a run, point by point; nothing is signed while one is open. */
export function PointsCard({ run, review, summary, store }: Props) {
  const [isRaising, setIsRaising] = useState(false);
  const numbers = pointNumbers(review.points);
  usePointOfAddress();
  const mayRaise = review.may.includes('review.raise');
  const unsettled = review.points.filter(({ state }) => state !== 'closed').length;
  return (
    <Card
      title="Points"
      aside={
        review.points.length ? (unsettled ? `${unsettled} not closed` : 'all closed') : undefined
      }
    >
      {review.points.length === 0 && !isRaising ? (
        <Txt tone="soft">
          {mayRaise
            ? 'None raised yet. Choose a place and a time on the drawings, then raise a point there.'
            : 'None raised.'}
        </Txt>
      ) : null}
      {isRaising ? (
        <RaisePoint run={run} summary={summary} store={store} onDone={() => setIsRaising(false)} />
      ) : mayRaise ? (
        <Button label="Raise a point" onPress={() => setIsRaising(true)} />
      ) : null}
      {review.points.length ? (
        <List label="Points">
          {sortPoints(review.points).map((point) => (
            <PointLine
              key={point.id}
              point={point}
              number={numbers.get(point.id)!}
              run={run}
              may={review.may}
              stations={summary.stations}
              store={store}
            />
          ))}
        </List>
      ) : null}
    </Card>
  );
}
