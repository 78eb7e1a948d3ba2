import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useSignRun } from '@/components/queries/reviews';
import { useMe } from '@/components/queries/SessionProvider';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Facts } from '@/components/ui/Facts';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { signSchema } from '@/shared/review/schemas';
import { signStatement } from '@/shared/review/statement';
import type { Run } from '@/shared/runs/types';

/** The signature: what is confirmed, by whom, on what; then the password again. */
export function SignDialog({ run, onClose }: { run: Run; onClose: () => void }) {
  const me = useMe();
  const sign = useSignRun(run.id);
  const statement = signStatement(run);
  const form = useYupForm({
    schema: signSchema,
    initial: { statement, password: '' },
    onSubmit: async (body) => {
      await sign.mutateAsync(body);
      onClose();
    },
  });
  return (
    <Dialog title={`Sign run ${run.number}`} open onClose={onClose}>
      <Notice title="You confirm" still>
        <Txt>{statement}</Txt>
      </Notice>
      <Facts
        facts={[
          ['Name', me.name],
          ['Qualification', me.qualification],
          ['Registration', me.registrationNumber],
          ['Solver', run.solverVersion],
          ['Inputs', run.caseHash],
        ]}
      />
      <Txt variant="small" tone="soft">
        From now on the run, its checklist and its points cannot change. A signature can be
        withdrawn with a reason; its record stays.
      </Txt>
      <FormRoot form={form} label={`Sign run ${run.number}`} failedTitle="Not signed">
        <FormTextField
          name="password"
          label="Your password again"
          secret
          autoComplete="current-password"
        />
        <FormSubmit label="Sign" wide />
        <Button label="Close" wide onPress={onClose} />
      </FormRoot>
    </Dialog>
  );
}
