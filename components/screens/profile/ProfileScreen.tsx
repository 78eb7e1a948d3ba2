import { ROLE_NAMES } from '@/shared/accounts/roles';
import { Screen } from '@/components/layout/Screen';
import { useMe } from '@/components/queries/SessionProvider';
import { AppearanceCard } from './AppearanceCard';
import { DetailsCard } from './DetailsCard';
import { PasswordCard } from './PasswordCard';
import { SessionsCard } from './SessionsCard';

/** One's own account. */
export function ProfileScreen() {
  const me = useMe();
  return (
    <Screen
      title={me.name}
      crumbs={[{ label: me.firm.name }]}
      lead={`${me.roles.map((role) => ROLE_NAMES[role]).join(', ')} · ${me.email}`}
      side={
        <>
          <AppearanceCard />
          <SessionsCard />
        </>
      }
    >
      <DetailsCard />
      <PasswordCard />
    </Screen>
  );
}
