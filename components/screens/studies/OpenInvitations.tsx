import { View } from 'react-native';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import { useInvitations } from '@/components/queries/invitations';
import { formatDay } from '@/components/ui/formatDay';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';

/** Who has been invited to the study and has not come yet. */
export function OpenInvitations({ studyId }: { studyId: number }) {
  const { data } = useInvitations();
  const open = data?.filter((one) => one.studyId === studyId && one.acceptedAt === null) ?? [];
  if (open.length === 0) return null;
  return (
    <List label="Invited, not yet here">
      {open.map((one) => (
        <View key={one.id}>
          <Txt>{one.email}</Txt>
          <Txt variant="small" tone="soft">
            {`Invited as ${one.roles.map((role) => ROLE_NAMES[role].toLowerCase()).join(', ')} · link holds until ${formatDay(one.expiresAt)}`}
          </Txt>
        </View>
      ))}
    </List>
  );
}
