import { useState } from 'react';
import { signInSchema } from '@/shared/accounts/schemas';
import type { Me } from '@/shared/accounts/types';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { useSession } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';

/** Over the screen whose session ended: what was typed below stays. */
export function SignInAgain({ me }: { me: Me }) {
  const { open, forget } = useSession();
  const [isOther, setIsOther] = useState(false);
  const form = useYupForm({
    schema: signInSchema,
    initial: { email: me.email, password: '' },
    onSubmit: async (body) => {
      const session = await accounts.signIn(body);
      if (session.me.id === me.id) open(session);
      else setIsOther(true);
    },
  });
  return (
    <Dialog title="Sign in again" open>
      <Txt>
        Your session has ended. What you typed is still here: sign in, then repeat the last step.
      </Txt>
      {isOther ? (
        <Notice tone="attention">
          {`This screen belongs to ${me.name}. Leave it to go on as somebody else.`}
        </Notice>
      ) : null}
      <FormRoot form={form} label="Sign in again" failedTitle="Not signed in">
        <FormTextField name="email" label="E-mail" inputMode="email" autoComplete="username" />
        <FormTextField name="password" label="Password" secret autoComplete="current-password" />
        <FormSubmit label="Sign in" wide />
        <Button label="Leave this screen" kind="quiet" onPress={forget} />
      </FormRoot>
    </Dialog>
  );
}
