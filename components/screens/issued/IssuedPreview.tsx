import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { Empty } from '@/components/ui/Empty';
import { IssuedPage } from './IssuedPage';

/** The engineers' look at the client's page. */
export function IssuedPreview() {
  const { study, may } = useCurrentStudy();
  const crumbs = [
    { label: study.title, href: `/studies/${study.id}` as const },
    { label: "The client's page" },
  ];
  return (
    <IssuedPage
      study={study}
      crumbs={crumbs}
      isClient={!may('study.change')}
      empty={
        <Screen title="The client's page" crumbs={crumbs}>
          <Empty title="Nothing has been issued yet">
            A run that is signed can be issued from its check; it then stands here as the client
            sees it.
          </Empty>
        </Screen>
      }
    />
  );
}
