import { useState } from 'react';
import { LIMITS } from '@/shared/limits';
import { passwordResetConfirmSchema } from '@/shared/accounts/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { useSession } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Notice } from '@/components/ui/Notice';
import { AuthPage } from './AuthPage';
import { useLinkToken } from './useLinkToken';

/** Where the link of the reset mail leads. */
export function ResetScreen() {
  const token = useLinkToken();
  const { forget } = useSession();
  const [isDone, setIsDone] = useState(false);
  const form = useYupForm({
    schema: passwordResetConfirmSchema,
    initial: { token, password: '' },
    onSubmit: async (body) => {
      await accounts.confirmReset(body);
      forget();
      setIsDone(true);
    },
  });
  if (isDone) {
    return (
      <AuthPage title="New password set">
        <Notice tone="done">
          It holds from now on. You were signed out on every device that still used the old one.
        </Notice>
        <Button kind="solid" label="Sign in" href="/sign-in" wide />
      </AuthPage>
    );
  }
  if (token === '') {
    return (
      <AuthPage title="This link is not complete">
        <Notice tone="attention">
          Part of the address is missing. Open the link from the mail itself, or have a new one
          sent.
        </Notice>
        <Button kind="solid" label="Send a new link" href="/forgot" wide />
      </AuthPage>
    );
  }
  return (
    <AuthPage
      title="Choose a new password"
      after={<LinkTxt href="/forgot">The link no longer works? Have a new one sent</LinkTxt>}
    >
      <FormRoot form={form} label="New password" failedTitle="Password not changed">
        <FormTextField
          name="password"
          label="New password"
          hint={`At least ${LIMITS.password.min} characters; a sentence is good.`}
          secret
          autoComplete="new-password"
        />
        <FormSubmit label="Set the password" wide />
      </FormRoot>
    </AuthPage>
  );
}
