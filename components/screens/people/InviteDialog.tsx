import { invitationSchema } from '@/shared/accounts/schemas';
import type { Role } from '@/shared/accounts/roles';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useInvite } from '@/components/queries/invitations';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Dialog } from '@/components/ui/Dialog';
import { RolesField } from './RolesField';

interface InviteValues {
  email: string;
  roles: Role[];
  studyId: null;
}

export function InviteDialog({ onClose }: { onClose: () => void }) {
  const invite = useInvite();
  const initial: InviteValues = { email: '', roles: [], studyId: null };
  const form = useYupForm({
    schema: invitationSchema,
    initial,
    onSubmit: async (body) => {
      await invite.mutateAsync(body);
      onClose();
    },
  });
  return (
    <Dialog title="Invite somebody" open onClose={form.formik.dirty ? undefined : onClose}>
      <FormRoot form={form} label="Invite somebody" failedTitle="Not invited">
        <FormTextField
          name="email"
          label="E-mail"
          hint="They get a link that holds for seven days and works once."
          inputMode="email"
          autoFocus
        />
        <RolesField name="roles" />
        <ButtonRow>
          <FormSubmit label="Send the invitation" />
          <Button label="Cancel" onPress={onClose} />
        </ButtonRow>
      </FormRoot>
    </Dialog>
  );
}
