import { useState } from 'react';
import { Screen } from '@/components/layout/Screen';
import { NotThere } from '@/components/layout/NotThere';
import { useMe } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import { InvitationsCard } from './InvitationsCard';
import { InviteDialog } from './InviteDialog';
import { UsersCard } from './UsersCard';

/** The administrators' page: who belongs to the firm and what they may do. */
export function PeopleScreen() {
  const me = useMe();
  const [isInviting, setIsInviting] = useState(false);
  if (!me.roles.includes('administrator')) return <NotThere />;
  return (
    <Screen
      title="People"
      crumbs={[{ label: me.firm.name }]}
      lead="Accounts are opened by invitation. A change of roles, and closing an account, hold at once."
      actions={<Button kind="solid" label="Invite somebody" onPress={() => setIsInviting(true)} />}
    >
      <UsersCard />
      <InvitationsCard />
      {isInviting ? <InviteDialog onClose={() => setIsInviting(false)} /> : null}
    </Screen>
  );
}
