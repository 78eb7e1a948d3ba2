import { useState } from 'react';
import { passwordChangeSchema } from '@/shared/accounts/schemas';
import { LIMITS } from '@/shared/limits';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';

export function PasswordCard() {
  const [isSaved, setIsSaved] = useState(false);
  const form = useYupForm({
    schema: passwordChangeSchema,
    initial: { current: '', next: '' },
    onSubmit: async (body) => {
      await accounts.changePassword(body);
      setIsSaved(true);
      form.formik.resetForm();
    },
  });
  return (
    <Card title="Password">
      <FormRoot form={form} label="Password" failedTitle="Password not changed">
        <FormTextField
          name="current"
          label="Password you have now"
          secret
          autoComplete="current-password"
        />
        <FormTextField
          name="next"
          label="New password"
          hint={`At least ${LIMITS.password.min} characters; a sentence is good.`}
          secret
          autoComplete="new-password"
        />
        <FormSubmit label="Change the password" kind="outline" />
        {isSaved && !form.formik.dirty ? (
          <Notice tone="done">Changed. Your other devices were signed out.</Notice>
        ) : null}
      </FormRoot>
    </Card>
  );
}
