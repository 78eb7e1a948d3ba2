import type { Study } from '@/shared/studies/types';
import { Screen } from '@/components/layout/Screen';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { Txt } from '@/components/ui/Txt';
import { UNIT_SYSTEM_NAMES } from './unitSystemNames';

/** What a surveyor needs to know before handing in. */
export function SurveyorStudy({ study }: { study: Study }) {
  return (
    <Screen
      title={study.title}
      crumbs={[{ label: 'Your reaches', href: '/' }]}
      narrow
      actions={
        <Button kind="solid" label="Hand in cross-sections" href={`/studies/${study.id}/survey`} />
      }
    >
      <Card title="For the survey">
        <Facts
          facts={[
            ['Place', study.place],
            ['Vertical datum', study.verticalDatum],
            ['Units', UNIT_SYSTEM_NAMES[study.unitSystem]],
            ['In charge', study.createdBy],
          ]}
        />
        <Txt tone="soft">
          Elevations refer to this datum. Points run from the left bank to the right, looking
          downstream; chainage is measured along the reach.
        </Txt>
      </Card>
    </Screen>
  );
}
