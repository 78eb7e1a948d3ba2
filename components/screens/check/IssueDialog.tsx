import { View } from 'react-native';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useMembers } from '@/components/queries/members';
import { useIssueRun } from '@/components/queries/reviews';
import { useRunSummary } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Checkbox } from '@/components/ui/Checkbox';
import { Dialog } from '@/components/ui/Dialog';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { LIMITS } from '@/shared/limits';
import { issueSchema } from '@/shared/review/schemas';
import type { Run, RunSummary } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';

/** Chooses what the client is to see, and sends it. */
export function IssueDialog({ run, onClose }: { run: Run; onClose: () => void }) {
  const { data: summary } = useRunSummary(run.id);
  return (
    <Dialog title={`Issue run ${run.number} to the client`} open onClose={onClose}>
      {summary ? (
        <IssueForm run={run} stations={summary.stations} onClose={onClose} />
      ) : (
        <Loading what="Reading the stations…" />
      )}
    </Dialog>
  );
}

interface FormProps {
  run: Run;
  stations: RunSummary['stations'];
  onClose: () => void;
}

function IssueForm({ run, stations, onClose }: FormProps) {
  const unitSystem = useUnitSystem();
  const issue = useIssueRun(run.id);
  const form = useYupForm({
    schema: issueSchema,
    initial: { stationIds: stations.map(({ stationId }) => stationId), message: '' },
    onSubmit: async (body) => {
      await issue.mutateAsync(body);
      onClose();
    },
  });
  const chosen = form.formik.values.stationIds;
  const choose = (stationId: number, isOn: boolean) =>
    void form.formik.setFieldValue(
      'stationIds',
      isOn ? [...chosen, stationId] : chosen.filter((id) => id !== stationId),
    );
  const fault = form.errorOf('stationIds');
  return (
    <FormRoot form={form} label="Issue to the client" failedTitle="Not issued">
      <Readers studyId={run.studyId} />
      <View role="group" aria-label="Stations that the client sees">
        <Txt variant="small" strong>
          Stations that the client sees
        </Txt>
        {stations.length === 0 ? (
          <Txt tone="soft">
            The study has no station on this reach. Name one under Stations before the run is
            signed.
          </Txt>
        ) : null}
        {stations.map(({ stationId, name, chainage }) => (
          <Checkbox
            key={stationId}
            label={name}
            hint={formatWithUnit(chainage, 'chainage', unitSystem)}
            checked={chosen.includes(stationId)}
            onChange={(isOn) => choose(stationId, isOn)}
          />
        ))}
        {fault ? (
          <Txt role="alert" variant="small" tone="brick" strong>
            {fault}
          </Txt>
        ) : null}
      </View>
      <FormTextField
        name="message"
        label="Words to the client"
        hint="Stand in the e-mail above the link."
        optional
        lines={3}
        maxLength={LIMITS.textLong}
      />
      <FormSubmit label="Issue" wide disabled={stations.length === 0} />
      <Button label="Close" wide onPress={onClose} />
    </FormRoot>
  );
}

/** Who is told. */
function Readers({ studyId }: { studyId: number }) {
  const { data: members } = useMembers(studyId);
  if (!members) return null;
  const clients = members.filter((member) => member.as === 'client');
  if (clients.length === 0)
    return (
      <Notice tone="attention" title="The study is shared with no client yet" still>
        Issue it all the same, and share the study afterwards: whoever it is shared with as a client
        then finds it there.
      </Notice>
    );
  return <Txt>{`Told by e-mail: ${clients.map(({ name }) => name).join(', ')}.`}</Txt>;
}
