import type { Study } from '@/shared/studies/types';
import { Cautions } from '@/components/layout/Cautions';
import { Screen } from '@/components/layout/Screen';
import { Card } from '@/components/ui/Card';
import { Facts } from '@/components/ui/Facts';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { IssuedPage } from '../issued/IssuedPage';

/** The client's page: what was issued, and nothing else. */
export function ClientStudy({ study, firmName }: { study: Study; firmName: string }) {
  return (
    <IssuedPage
      study={study}
      crumbs={[{ label: `Shared with you by ${firmName}` }]}
      isClient
      empty={<NothingIssued study={study} firmName={firmName} />}
    />
  );
}

/** Before anything is issued: says so, and what will stand here. */
function NothingIssued({ study, firmName }: { study: Study; firmName: string }) {
  return (
    <Screen title={study.title} crumbs={[{ label: `Shared with you by ${firmName}` }]} narrow>
      <Notice still title="Nothing has been issued yet">
        <Txt>
          {`${firmName} is still at work on this study. Results are shown here once a licensed engineer has checked and signed them, so that you never plan on a figure that may still change.`}
        </Txt>
      </Notice>
      <Card title="What will stand here">
        <Txt>
          At the places that matter to you: how high the water gets, when it starts to rise and when
          it stands highest, with the curve of stage against time, and the signed report to keep.
        </Txt>
        <Txt tone="soft">
          There is nothing you need to do. This page shows it as soon as it is issued.
        </Txt>
      </Card>
      <Card title="The study">
        <Facts
          facts={[
            ['Place', study.place],
            ['For', study.clientName],
            ['Vertical datum', study.verticalDatum],
            ['Purpose', study.purpose],
          ]}
        />
      </Card>
      <Cautions />
    </Screen>
  );
}
