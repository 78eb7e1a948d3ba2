import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { useInvitations } from '@/components/queries/invitations';
import { InvitationLine } from './InvitationLine';

/** Invitations that nobody has accepted yet. */
export function InvitationsCard() {
  const { data, error, refetch } = useInvitations();
  const open = data?.filter((invitation) => invitation.acceptedAt === null);
  return (
    <Card title="Open invitations" aside={open?.length ? String(open.length) : undefined}>
      {error && !data ? (
        <ErrorState
          error={error}
          title="The invitations could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!data && !error ? <Loading what="Reading the invitations…" /> : null}
      {open?.length === 0 ? (
        <Txt tone="soft">None. Who accepts one moves up to the accounts.</Txt>
      ) : null}
      {open?.length ? (
        <List label="Open invitations">
          {open.map((invitation) => (
            <InvitationLine key={invitation.id} invitation={invitation} />
          ))}
        </List>
      ) : null}
    </Card>
  );
}
