import { userChangeSchema } from '@/shared/accounts/schemas';
import type { UserRow } from '@/shared/accounts/types';
import { FormCheckbox } from '@/components/forms/FormCheckbox';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { useYupForm } from '@/components/forms/useYupForm';
import { useMe } from '@/components/queries/SessionProvider';
import { useChangeUser } from '@/components/queries/users';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Dialog } from '@/components/ui/Dialog';
import { Notice } from '@/components/ui/Notice';
import { RolesField } from './RolesField';

export function PersonDialog({ user, onClose }: { user: UserRow; onClose: () => void }) {
  const me = useMe();
  const change = useChangeUser();
  const form = useYupForm({
    schema: userChangeSchema,
    initial: { roles: user.roles, active: user.active },
    onSubmit: async (body) => {
      await change.mutateAsync({ id: user.id, ...body });
      onClose();
    },
  });
  const { active, roles } = form.formik.values;
  const losesSelf = user.id === me.id && (!active || !roles.includes('administrator'));
  return (
    <Dialog title={user.name} open onClose={form.formik.dirty ? undefined : onClose}>
      <FormRoot form={form} label={`Roles of ${user.name}`}>
        <RolesField name="roles" />
        <FormCheckbox
          name="active"
          label="Account is open"
          hint="A closed account cannot sign in and is signed out everywhere at once; its work stays."
        />
        {losesSelf ? (
          <Notice tone="attention">
            This is your own account: after saving you can no longer open this page.
          </Notice>
        ) : null}
        <ButtonRow>
          <FormSubmit label="Save" />
          <Button label="Leave as it was" onPress={onClose} />
        </ButtonRow>
      </FormRoot>
    </Dialog>
  );
}
