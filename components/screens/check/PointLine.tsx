import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { PointStep } from '@/components/queries/reviews';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Review, ReviewPoint } from '@/shared/review/types';
import type { Run } from '@/shared/runs/types';
import { wallClock } from '@/components/ui/wallClock';
import { pointAnchor } from './jumpToPoint';
import { PointReply } from './PointReply';
import { pointSteps } from './pointSteps';
import { POINT_STATES, pointPlace } from './reviewWords';

interface Props {
  point: ReviewPoint;
  /** As on the drawings and in the report. */
  number: number;
  run: Run;
  may: Review['may'];
  stations: readonly { name: string; chainage: number }[];
  store: PlaceAndTimeStore;
}

const KINDS = { answer: 'answers', closed: 'closes it', reopened: 'opens it again' } as const;

/** One point with what was said to it, and what may be done next. */
export function PointLine({ point, number, run, may, stations, store }: Props) {
  const unitSystem = useUnitSystem();
  const [step, setStep] = useState<PointStep | null>(null);
  const { chainage, time } = point;
  const where = pointPlace(point, stations, run.duration, unitSystem);
  const show = () =>
    store.set({
      ...(chainage === null ? {} : { at: chainage }),
      ...(time === null ? {} : { t: time }),
    });
  return (
    <View style={styles.point} id={pointAnchor(point.id)} tabIndex={-1}>
      <View style={styles.head}>
        <Txt strong>{`Point ${number}`}</Txt>
        <View>
          <Badge {...POINT_STATES[point.state]} />
        </View>
        {where ? (
          <Button kind="quiet" label={where} name={`Show ${where}`} onPress={show} />
        ) : (
          <Txt variant="small" tone="soft">
            On the run as a whole
          </Txt>
        )}
      </View>
      <Txt>{point.text}</Txt>
      <Txt variant="small" tone="soft">
        {`${point.raisedBy.name}, ${wallClock(point.raisedAt)}`}
      </Txt>
      {point.entries.map((entry, i) => (
        <View key={i} style={styles.entry}>
          <Txt variant="small" tone="soft">
            {`${entry.by} ${KINDS[entry.kind]}, ${wallClock(entry.at)}`}
          </Txt>
          {entry.text ? <Txt>{entry.text}</Txt> : null}
        </View>
      ))}
      {step ? (
        <PointReply runId={run.id} point={point} step={step} onDone={() => setStep(null)} />
      ) : (
        <ButtonRow>
          {pointSteps(point, may).map(({ step: next, label }) => (
            <Button
              key={next}
              label={label}
              name={`${label}: ${point.text.slice(0, 60)}`}
              onPress={() => setStep(next)}
            />
          ))}
        </ButtonRow>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  point: { gap: space.half },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.half },
  entry: { paddingLeft: space.two, gap: 2 },
});
