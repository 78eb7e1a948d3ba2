import { useState } from 'react';
import { invitationSchema } from '@/shared/accounts/schemas';
import type { StudyMember } from '@/shared/studies/types';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useInvite } from '@/components/queries/invitations';
import { Notice } from '@/components/ui/Notice';

/** By e-mail, to somebody who has no account yet. */
export function InviteToStudy({ studyId, as }: { studyId: number; as: StudyMember['as'] }) {
  const invite = useInvite();
  const [sentTo, setSentTo] = useState<string | null>(null);
  const form = useYupForm({
    schema: invitationSchema.pick(['email']),
    initial: { email: '' },
    onSubmit: async ({ email }) => {
      setSentTo(null);
      await invite.mutateAsync({ email, roles: [as], studyId });
      setSentTo(email);
      form.formik.resetForm();
    },
  });
  return (
    <FormRoot form={form} label="Invite by e-mail" failedTitle="Not invited">
      <FormTextField
        name="email"
        label="Somebody new, by e-mail"
        hint="They get a link that holds for seven days and works once."
        inputMode="email"
      />
      <FormSubmit label="Send the invitation" kind="outline" />
      {sentTo ? <Notice tone="done">{`The invitation to ${sentTo} is on its way.`}</Notice> : null}
    </FormRoot>
  );
}
