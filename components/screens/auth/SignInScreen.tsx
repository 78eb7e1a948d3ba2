import { signInSchema } from '@/shared/accounts/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { useSession } from '@/components/queries/SessionProvider';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Txt } from '@/components/ui/Txt';
import { AuthPage } from './AuthPage';

/** The layout around it leads on as soon as there is a session. */
export function SignInScreen() {
  const { open } = useSession();
  const form = useYupForm({
    schema: signInSchema,
    initial: { email: '', password: '' },
    onSubmit: async (body) => open(await accounts.signIn(body)),
  });
  return (
    <AuthPage
      title="Sign in"
      lead="Surveyed reach and design flood in; stage, flow and arrival times out."
      after={
        <Txt variant="small" tone="soft">
          Accounts are opened by invitation: ask the administrator of your firm, or the engineer who
          shares a study with you.
        </Txt>
      }
    >
      <FormRoot form={form} label="Sign in" failedTitle="Not signed in">
        <FormTextField name="email" label="E-mail" inputMode="email" autoComplete="username" />
        <FormTextField name="password" label="Password" secret autoComplete="current-password" />
        <FormSubmit label="Sign in" wide />
        <LinkTxt href="/forgot">Forgotten the password?</LinkTxt>
      </FormRoot>
    </AuthPage>
  );
}
