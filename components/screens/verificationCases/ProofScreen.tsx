import { NotThere } from '@/components/layout/NotThere';
import { isEngineer } from '@/components/layout/places';
import { Screen } from '@/components/layout/Screen';
import { useMe } from '@/components/queries/SessionProvider';
import {
  goesOn,
  useCancelCases,
  useRunCases,
  useVerificationCases,
} from '@/components/queries/verificationCases';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { CASE_GROUPS, type VerificationList } from '@/shared/verificationCases/types';
import { AnnexCard } from './AnnexCard';
import { CaseGroupCard } from './CaseGroupCard';
import { countWords } from './caseWords';
import { MeaningCard } from './MeaningCard';

/** Published cases, routed by the solver that routes the floods. */
export function ProofScreen() {
  const me = useMe();
  return isEngineer(me) ? <Proof /> : <NotThere />;
}

function Proof() {
  const me = useMe();
  const { data, error, isPending, refetch } = useVerificationCases();
  return (
    <Screen
      title="Proof"
      crumbs={[{ label: me.firm.name }]}
      lead="Cases with published answers, routed by the solver that routes your floods, and held against what is right."
      actions={data ? <Actions list={data} /> : null}
      side={
        data ? (
          <>
            <AnnexCard list={data} />
            <MeaningCard />
          </>
        ) : null
      }
    >
      {error && !data ? (
        <ErrorState
          error={error}
          title="The cases could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {isPending ? <Loading what="Reading the cases…" /> : null}
      {data ? (
        <>
          <Txt role="status">{`${countWords(data.cases)} Solver ${data.solver}.`}</Txt>
          {CASE_GROUPS.map((group) => (
            <CaseGroupCard
              key={group}
              group={group}
              rows={data.cases.filter((row) => row.group === group)}
            />
          ))}
        </>
      ) : null}
    </Screen>
  );
}

function Actions({ list }: { list: VerificationList }) {
  const run = useRunCases();
  const cancel = useCancelCases();
  const isGoing = list.cases.some(goesOn);
  const error = run.error ?? cancel.error;
  return (
    <>
      {error ? <ErrorState error={error} /> : null}
      {isGoing ? (
        <Button
          label="Cancel"
          name="Cancel the cases that wait or run"
          busy={cancel.isPending}
          onPress={() => cancel.mutate(list.open.map(({ id }) => id))}
        />
      ) : (
        <Button
          kind="solid"
          label="Run all"
          busy={run.isPending}
          onPress={() => run.mutate(undefined)}
        />
      )}
    </>
  );
}
