import { useMemo } from 'react';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace, usePlaceAndTimeStore } from '@/components/charts/usePlaceAndTime';
import { Cautions } from '@/components/layout/Cautions';
import { Screen } from '@/components/layout/Screen';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Badge } from '@/components/ui/Badge';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Review } from '@/shared/review/types';
import type { Run, RunSummary } from '@/shared/runs/types';
import { ReportCard } from '../reports/ReportCard';
import { LongSectionCard } from '../runs/results/LongSectionCard';
import { TimeBar } from '../runs/results/TimeBar';
import { useFirstLook } from '../runs/results/useFirstLook';
import { usePlaceResults } from '../runs/results/usePlaceResults';
import { CheckActions } from './CheckActions';
import { checkCrumbs } from './checkCrumbs';
import { ChecklistCard } from './ChecklistCard';
import { jumpToPoint } from './jumpToPoint';
import { NoteCard } from './NoteCard';
import { PointsCard } from './PointsCard';
import { raisedPoints } from './raisedPoints';
import { runBadge } from './reviewWords';
import { SendCard } from './SendCard';
import { SignOffCard } from './SignOffCard';
import { StageCard } from './StageCard';
import { StandingNotice } from './StandingNotice';

interface Props {
  run: Run;
  review: Review;
  summary: RunSummary;
}

/** Result and discussion side by side: a press on a drawing chooses what the next point is about. */
export function CheckContent({ run, review, summary }: Props) {
  const store = usePlaceAndTimeStore();
  useFirstLook(store, summary);
  const place = usePlaceResults(run, summary, usePlace(store));
  const common = { run, summary, store };
  const { isWide } = useBreakpoint();
  const system = useUnitSystem();
  const raised = useMemo(
    () => raisedPoints(review.points, summary.stations, run.duration, system),
    [review.points, summary.stations, run.duration, system],
  );
  const pinned = { raised, onPoint: jumpToPoint };
  const wasSent = review.state !== null;
  const actions = <CheckActions run={run} review={review} />;
  const signature = review.signOff ? (
    <SignOffCard signOff={review.signOff} reads={review.reads} />
  ) : null;
  const points = wasSent ? <PointsCard {...common} review={review} /> : null;
  const report = <ReportCard run={run} />;
  return (
    <Screen
      title={`Check of run ${run.number}`}
      crumbs={checkCrumbs(run)}
      badge={<Badge {...runBadge({ ...run, review: review.state })} />}
      lead={`${run.scenarioName}. Asked for by ${run.requestedBy}.`}
      ribbon={<Ribbon summary={summary} review={review} store={store} />}
      actions={isWide ? actions : undefined}
      side={
        isWide ? (
          <>
            {signature}
            {points}
            {report}
          </>
        ) : null
      }
      footer={<TimeBar {...common} />}
    >
      <StandingNotice review={review} />
      {/* On a phone the foot is the time ribbon's, and the end of the page is far away. */}
      {isWide ? null : (
        <>
          <ButtonRow>{actions}</ButtonRow>
          {signature}
        </>
      )}
      {review.may.includes('review.send') ? <SendCard run={run} review={review} /> : null}
      <LongSectionCard {...common} {...pinned} place={place} />
      <StageCard {...common} {...pinned} place={place} />
      {isWide ? null : points}
      <ChecklistCard run={run} review={review} />
      {wasSent ? <NoteCard review={review} /> : null}
      {isWide ? null : report}
      <Cautions />
    </Screen>
  );
}

function Ribbon({
  summary,
  review,
  store,
}: Pick<Props, 'summary' | 'review'> & { store: PlaceAndTimeStore }) {
  const unsettled = review.points.flatMap(({ chainage, state }) =>
    chainage === null || state === 'closed' ? [] : [{ chainage }],
  );
  return (
    <ReachRibbon
      sections={summary.sections}
      stations={summary.stations}
      advice={unsettled}
      at={usePlace(store)}
      onChange={store.setAt}
      unitSystem={useUnitSystem()}
    />
  );
}
