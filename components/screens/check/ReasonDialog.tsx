import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useReturnRun, useWithdrawRun } from '@/components/queries/reviews';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import { reasonSchema } from '@/shared/review/schemas';
import type { Run } from '@/shared/runs/types';

interface Props {
  run: Run;
  kind: 'return' | 'withdraw';
  onClose: () => void;
}

const WORDS = {
  return: {
    title: (run: Run) => `Return run ${run.number}`,
    lead: 'The run goes back to the modeller, who is told by e-mail. Points stay as they are.',
    hint: 'What has to be different before it can be signed.',
    button: 'Return the run',
    failed: 'Not returned',
  },
  withdraw: {
    title: (run: Run) => `Withdraw the signature on run ${run.number}`,
    lead: 'This cannot be taken back. The record stays, the report is marked WITHDRAWN on every page, the verification page says so, and the client is told by e-mail if the run was issued.',
    hint: 'Why nobody may rely on it any more. The client reads these words.',
    button: 'Withdraw the signature',
    failed: 'Not withdrawn',
  },
} as const;

/** A decision that needs its reason. */
export function ReasonDialog({ run, kind, onClose }: Props) {
  const words = WORDS[kind];
  const toReturn = useReturnRun(run.id);
  const toWithdraw = useWithdrawRun(run.id);
  const form = useYupForm({
    schema: reasonSchema,
    initial: { reason: '' },
    onSubmit: async (body) => {
      await (kind === 'return' ? toReturn : toWithdraw).mutateAsync(body);
      onClose();
    },
  });
  return (
    <Dialog title={words.title(run)} open onClose={onClose}>
      <Txt>{words.lead}</Txt>
      <FormRoot form={form} label={words.title(run)} failedTitle={words.failed}>
        <FormTextField
          name="reason"
          label="Reason"
          hint={words.hint}
          lines={4}
          maxLength={LIMITS.textLong}
          autoFocus
        />
        <FormSubmit kind={kind === 'withdraw' ? 'danger' : 'solid'} label={words.button} wide />
        <Button label="Close" wide onPress={onClose} />
      </FormRoot>
    </Dialog>
  );
}
