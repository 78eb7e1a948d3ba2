import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import type { UserRow } from '@/shared/accounts/types';
import { useUsers } from '@/components/queries/users';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { formatDay } from '@/components/ui/formatDay';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { PersonDialog } from './PersonDialog';

const lastSeen = (user: UserRow): string =>
  user.lastSignInAt ? `last signed in ${formatDay(user.lastSignInAt)}` : 'has not signed in yet';

export function UsersCard() {
  const { data: users, error, refetch } = useUsers();
  const [chosen, setChosen] = useState<UserRow | null>(null);
  return (
    <Card title="Accounts" aside={users ? String(users.length) : undefined}>
      {error && !users ? (
        <ErrorState
          error={error}
          title="The accounts could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!users && !error ? <Loading what="Reading the accounts…" /> : null}
      {users ? (
        <List label="Accounts">
          {users.map((user) => (
            <View key={user.id} style={styles.user}>
              <View style={styles.names}>
                <View style={styles.nameRow}>
                  <Txt variant="lead" strong>
                    {user.name}
                  </Txt>
                  {user.active ? null : <Badge label="Closed" tone="ochre" />}
                </View>
                <Txt>{user.roles.map((role) => ROLE_NAMES[role]).join(', ')}</Txt>
                <Txt variant="small" tone="soft">
                  {`${user.email} · ${lastSeen(user)}`}
                </Txt>
              </View>
              <Button label="Change" name={`Change ${user.name}`} onPress={() => setChosen(user)} />
            </View>
          ))}
        </List>
      ) : null}
      {chosen ? <PersonDialog user={chosen} onClose={() => setChosen(null)} /> : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  user: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: space.two,
  },
  names: { flex: 1, minWidth: 0 },
  nameRow: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.one },
});
