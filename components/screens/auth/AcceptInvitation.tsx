import { useRouter } from 'expo-router';
import { invitationAcceptSchema } from '@/shared/accounts/schemas';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import type { InvitationPreview } from '@/shared/accounts/types';
import { LIMITS } from '@/shared/limits';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { useSession } from '@/components/queries/SessionProvider';
import { TextField } from '@/components/ui/TextField';
import { AuthPage } from './AuthPage';

interface AcceptInvitationProps {
  token: string;
  invitation: InvitationPreview;
}

export function AcceptInvitation({ token, invitation }: AcceptInvitationProps) {
  const router = useRouter();
  const { open } = useSession();
  const form = useYupForm({
    schema: invitationAcceptSchema,
    initial: { token, name: '', password: '' },
    onSubmit: async (body) => {
      open(await accounts.acceptInvitation(body));
      router.replace('/');
    },
  });
  const roles = invitation.roles.map((role) => ROLE_NAMES[role].toLowerCase()).join(' and ');
  return (
    <AuthPage
      title={`Welcome to ${invitation.firmName}`}
      lead={`You are invited as ${roles}. Say who you are and choose a password.`}
    >
      <FormRoot form={form} label="Accept the invitation" failedTitle="Account not opened">
        <TextField
          label="E-mail"
          value={invitation.email}
          onChange={() => undefined}
          autoComplete="username"
          disabled
        />
        <FormTextField
          name="name"
          label="Your name"
          hint="As it should stand under your work."
          autoComplete="name"
        />
        <FormTextField
          name="password"
          label="Password"
          hint={`At least ${LIMITS.password.min} characters; a sentence is good.`}
          secret
          autoComplete="new-password"
        />
        <FormSubmit label="Open the account" wide />
      </FormRoot>
    </AuthPage>
  );
}
