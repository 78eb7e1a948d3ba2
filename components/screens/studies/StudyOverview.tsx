import { useState } from 'react';
import { View } from 'react-native';
import type { Study } from '@/shared/studies/types';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { formatDay } from '@/components/ui/formatDay';
import { ChangeStudyDialog } from './ChangeStudyDialog';
import { MembersCard } from './MembersCard';
import { nextStep } from './nextStep';
import { PathCard } from './PathCard';
import { StudyRibbon } from './StudyRibbon';
import { StationsCard } from './StationsCard';
import { UNIT_SYSTEM_NAMES } from './unitSystemNames';

/** The engineers' view of a study: how far it has come, what it is, who sees it. */
export function StudyOverview({ study }: { study: Study }) {
  const [isChanging, setIsChanging] = useState(false);
  const { at, setAt } = usePlaceAndTime();
  const next = nextStep(study);
  return (
    <Screen
      title={study.title}
      crumbs={[{ label: 'Studies', href: '/' }]}
      actions={<Button kind="solid" label={next.label} href={next.href} />}
      ribbon={<StudyRibbon studyId={study.id} at={at} onChange={setAt} />}
      side={
        <>
          <MembersCard studyId={study.id} />
          <StationsCard studyId={study.id} at={at} onChoose={setAt} />
        </>
      }
    >
      <PathCard study={study} />
      <Card title="The study">
        <Facts
          facts={[
            ['Client', study.clientName],
            ['Place', study.place],
            ['Vertical datum', study.verticalDatum],
            ['Coordinate system', study.coordinateSystem],
            ['Units', UNIT_SYSTEM_NAMES[study.unitSystem]],
            ['Purpose', study.purpose],
            ['Made', `${formatDay(study.createdAt)} by ${study.createdBy}`],
          ]}
        />
        <View>
          <Button label="Change" name="Change the study" onPress={() => setIsChanging(true)} />
        </View>
      </Card>
      {isChanging ? <ChangeStudyDialog study={study} onClose={() => setIsChanging(false)} /> : null}
    </Screen>
  );
}
