import type { ReactNode } from 'react';
import { Screen } from '@/components/layout/Screen';
import { useIssued } from '@/components/queries/issued';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Study } from '@/shared/studies/types';
import { IssuedContent } from './IssuedContent';

interface Props {
  study: Study;
  /** Above the title: who shares it, or the way here. */
  crumbs: Parameters<typeof Screen>[0]['crumbs'];
  /** The reader is the client, who may confirm having read it. */
  isClient: boolean;
  /** Stands there until something is issued. */
  empty: ReactNode;
}

/** What was issued to the client of a study. */
export function IssuedPage({ study, crumbs, isClient, empty }: Props) {
  const { data: issued, error, refetch } = useIssued(study.id);
  if (issued?.length === 0) return empty;
  if (issued)
    return <IssuedContent study={study} issued={issued} crumbs={crumbs} isClient={isClient} />;
  return (
    <Screen title={study.title} crumbs={crumbs}>
      {error ? (
        <ErrorState
          error={error}
          title="What was issued could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading what was issued…" />
      )}
    </Screen>
  );
}
