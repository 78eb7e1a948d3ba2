import { router } from 'expo-router';
import { object, string } from 'yup';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';

const codeSchema = object({
  code: string().trim().max(60).required('Write the code from the cover of the report.'),
});

/** Types a code in. */
export function CodeForm({ start = '' }: { start?: string }) {
  const form = useYupForm({
    schema: codeSchema,
    initial: { code: start },
    onSubmit: async ({ code }) => router.push(`/verify/${encodeURIComponent(code)}`),
  });
  return (
    <FormRoot form={form} label="Verify a report">
      <FormTextField name="code" label="Verification code" autoComplete="off" maxLength={60} />
      <FormSubmit label="Look it up" wide />
    </FormRoot>
  );
}
