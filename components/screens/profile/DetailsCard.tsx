import { useState } from 'react';
import { profileSchema } from '@/shared/accounts/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { accounts } from '@/components/queries/accounts';
import { useMe, useSession } from '@/components/queries/SessionProvider';
import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';

export function DetailsCard() {
  const me = useMe();
  const { setMe } = useSession();
  const [isSaved, setIsSaved] = useState(false);
  const isEngineer = me.roles.includes('modeller') || me.roles.includes('seniorEngineer');
  const form = useYupForm({
    schema: profileSchema,
    initial: {
      name: me.name,
      qualification: me.qualification ?? '',
      registrationNumber: me.registrationNumber ?? '',
    },
    follow: true,
    onSubmit: async (body) => {
      setMe(await accounts.changeProfile(body));
      setIsSaved(true);
    },
  });
  return (
    <Card title="Name and standing">
      <FormRoot form={form} label="Name and standing">
        <FormTextField
          name="name"
          label="Name"
          hint="As it stands under your work."
          autoComplete="name"
        />
        {isEngineer ? (
          <>
            <FormTextField
              name="qualification"
              label="Qualification"
              hint="For instance chartered engineer; printed where you sign."
              optional
            />
            <FormTextField name="registrationNumber" label="Registration number" optional />
          </>
        ) : null}
        <FormSubmit label="Save" />
        {isSaved && !form.formik.dirty ? <Notice tone="done">Saved.</Notice> : null}
      </FormRoot>
    </Card>
  );
}
