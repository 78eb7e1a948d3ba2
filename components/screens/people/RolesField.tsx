import { View } from 'react-native';
import { ROLE_NAMES, ROLES, type Role } from '@/shared/accounts/roles';
import { useFormField } from '@/components/forms/useFormField';
import { Checkbox } from '@/components/ui/Checkbox';
import { Txt } from '@/components/ui/Txt';

const MEANING: Record<Role, string> = {
  administrator: 'Invites people and sets roles; sees no studies by this alone.',
  modeller: 'Makes reaches and scenarios, routes floods.',
  seniorEngineer: 'As the modeller, and checks what others ran.',
  surveyor: 'Hands in cross-sections for the reaches assigned to them.',
  client: 'Reads what is issued of the studies shared with them.',
};

/** One person may have several. */
export function RolesField({ name }: { name: string }) {
  const { value, error, onChange, disabled } = useFormField<Role[]>(name);
  const toggle = (role: Role, on: boolean) =>
    onChange(ROLES.filter((one) => (one === role ? on : value.includes(one))));
  return (
    <View role="group" aria-label="Roles">
      <Txt variant="small" strong>
        Roles
      </Txt>
      {ROLES.map((role) => (
        <Checkbox
          key={role}
          label={ROLE_NAMES[role]}
          hint={MEANING[role]}
          checked={value.includes(role)}
          disabled={disabled}
          onChange={(on) => toggle(role, on)}
        />
      ))}
      {error ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
    </View>
  );
}
