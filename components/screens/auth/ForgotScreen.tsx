import { passwordResetRequestSchema } from '@/shared/accounts/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Notice } from '@/components/ui/Notice';
import { useState } from 'react';
import { AuthPage } from './AuthPage';

export function ForgotScreen() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const form = useYupForm({
    schema: passwordResetRequestSchema,
    initial: { email: '' },
    onSubmit: async ({ email }) => {
      await accounts.requestReset(email);
      setSentTo(email);
    },
  });
  return (
    <AuthPage
      title="Forgotten password"
      lead="We send a link with which you choose a new one. It holds for one hour and works once."
      after={<LinkTxt href="/sign-in">Back to signing in</LinkTxt>}
    >
      <FormRoot form={form} label="Forgotten password" failedTitle="Not sent">
        <FormTextField name="email" label="E-mail" inputMode="email" autoComplete="username" />
        <FormSubmit label="Send the link" wide />
        {sentTo ? (
          <Notice tone="done" title="Look into your mail">
            {`If ${sentTo} has an account, the link is on its way. Nothing there after some minutes? See the spam folder, or check the address and send it again.`}
          </Notice>
        ) : null}
      </FormRoot>
    </AuthPage>
  );
}
