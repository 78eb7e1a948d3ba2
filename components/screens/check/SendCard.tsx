import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useRecipients, useSendForCheck } from '@/components/queries/reviews';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import { sendForCheckSchema } from '@/shared/review/schemas';
import type { Review } from '@/shared/review/types';
import type { Run } from '@/shared/runs/types';
import { unanswered } from './reviewWords';

/** Hands the run to whoever checks it, with what they must know. */
export function SendCard({ run, review }: { run: Run; review: Review }) {
  const send = useSendForCheck(run.id);
  const recipients = useRecipients();
  const form = useYupForm({
    schema: sendForCheckSchema,
    initial: {
      sentTo: review.sentTo?.id ?? (null as number | null),
      method: review.method,
      assumptions: review.assumptions,
      limits: review.limits,
    },
    onSubmit: (body) => send.mutateAsync(body),
  });
  const again = review.state === 'returned';
  const waiting = unanswered(review.checklist).length;
  const { sentTo } = form.formik.values;
  const nobody = recipients.data?.length === 0;
  return (
    <Card title={again ? 'Send for checking again' : 'Send for checking'}>
      <Txt tone="soft">
        Whoever checks it reads this first, and it stands in the report. From the signature on
        nothing of the run can change.
      </Txt>
      {recipients.error ? (
        <ErrorState
          error={recipients.error}
          title="The senior engineers could not be read"
          retry={() => void recipients.refetch()}
        />
      ) : null}
      {nobody ? (
        <Notice tone="attention" title="Nobody may check this run yet" still>
          The firm needs a senior engineer other than you. An administrator invites one, or gives
          the role.
        </Notice>
      ) : null}
      <FormRoot form={form} label="Send for checking" failedTitle="Not sent">
        <SelectField
          label="To"
          value={sentTo === null ? EVERYBODY : String(sentTo)}
          options={[
            { value: EVERYBODY, label: 'Every senior engineer of the firm' },
            ...(recipients.data ?? []).map(({ id, name }) => ({ value: String(id), label: name })),
          ]}
          onChange={(value) =>
            void form.formik.setFieldValue('sentTo', value === EVERYBODY ? null : Number(value))
          }
        />
        <FormTextField
          name="method"
          label="Method"
          hint="How it was computed and why so: grid, roughness, ends of the reach."
          lines={3}
          maxLength={LIMITS.textLong}
        />
        <FormTextField
          name="assumptions"
          label="Assumptions"
          hint="What was taken as given: inflow, survey, what is left out."
          lines={3}
          maxLength={LIMITS.textLong}
        />
        <FormTextField
          name="limits"
          label="Limits"
          hint="Where and for what the result must not be used."
          lines={3}
          maxLength={LIMITS.textLong}
        />
        {waiting > 0 ? (
          <Txt variant="small" tone="soft">
            {`${waiting === 1 ? 'One item of the checklist waits' : `${waiting} items of the checklist wait`} for your words below; without them it cannot be signed.`}
          </Txt>
        ) : null}
        <FormSubmit
          label={again ? 'Send for checking again' : 'Send for checking'}
          disabled={nobody}
        />
      </FormRoot>
    </Card>
  );
}

const EVERYBODY = 'everybody';
