import { useState } from 'react';
import { accounts } from '@/components/queries/accounts';
import { useSession } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';

export function SessionsCard() {
  const { signOut, forget } = useSession();
  const [isAsking, setIsAsking] = useState(false);
  const [failure, setFailure] = useState<unknown>(null);
  return (
    <Card title="Signed in">
      <Txt tone="soft">
        You stay signed in on this device for thirty days after you last used it.
      </Txt>
      <Button label="Sign out" wide onPress={() => void signOut().catch(setFailure)} />
      <Button label="Sign out everywhere" kind="danger" wide onPress={() => setIsAsking(true)} />
      {failure ? <ErrorState error={failure} title="Still signed in" /> : null}
      {isAsking ? (
        <ConfirmDialog
          title="Sign out everywhere?"
          confirm="Sign out everywhere"
          onClose={() => setIsAsking(false)}
          onConfirm={() => accounts.signOutEverywhere().then(forget)}
        >
          Every device with this account is signed out at once, this one too. Work that was not
          saved there is lost.
        </ConfirmDialog>
      ) : null}
    </Card>
  );
}
