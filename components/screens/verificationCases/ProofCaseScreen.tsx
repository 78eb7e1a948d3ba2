import { useLocalSearchParams } from 'expo-router';
import { pictureOfCase } from '@/components/charts/picture/pictureSources';
import { NotThere } from '@/components/layout/NotThere';
import { isEngineer } from '@/components/layout/places';
import { Screen } from '@/components/layout/Screen';
import { isApiError } from '@/components/queries/ApiError';
import { useMe } from '@/components/queries/SessionProvider';
import { goesOn, useRunCases, useVerificationCase } from '@/components/queries/verificationCases';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import type { VerificationCaseRow, VerificationDetail } from '@/shared/verificationCases/types';
import { AboutCard } from './AboutCard';
import { stateOf } from './caseWords';
import { CurvesCard } from './CurvesCard';
import { GridsCard } from './GridsCard';
import { VerdictCard } from './VerdictCard';

/** One published case: drawing, verdict, grids, source. */
export function ProofCaseScreen() {
  const me = useMe();
  const { caseId } = useLocalSearchParams<{ caseId: string }>();
  return isEngineer(me) ? <ProofCase caseId={caseId} /> : <NotThere />;
}

const PROOF = { label: 'Proof', href: '/proof' } as const;

function ProofCase({ caseId }: { caseId: string }) {
  const { data, error, refetch } = useVerificationCase(caseId);
  if (isApiError(error, 'notFound')) return <NotThere />;
  if (!data)
    return (
      <Screen title="Published case" crumbs={[PROOF]}>
        {error ? (
          <ErrorState
            error={error}
            title="The case could not be read"
            retry={() => void refetch()}
          />
        ) : (
          <Loading what="Reading the case…" />
        )}
      </Screen>
    );
  const { row } = data;
  const { label, tone } = stateOf(row);
  return (
    <Screen
      title={row.title}
      crumbs={[PROOF, { label: row.title }]}
      picture={pictureOfCase(row, row.result?.solver ?? data.solver)}
      lead={row.setup}
      badge={
        <>
          <Badge label={label} tone={tone} />
          {row.result?.isCurrent === false ? <Badge label="Older solver" tone="ochre" /> : null}
        </>
      }
      actions={<RunThis row={row} />}
      side={<AboutCard row={row} />}
    >
      <Content {...data} />
    </Screen>
  );
}

function Content({ row, result, solver }: VerificationDetail) {
  return (
    <>
      {row.latest?.state === 'failed' ? (
        <Notice tone="danger" title="The last run stopped with a fault" still>
          {`${row.latest.failure ?? 'No reason is known.'}${result ? ' What stands below was found before.' : ''}`}
        </Notice>
      ) : null}
      {row.result?.isCurrent === false ? (
        <Notice tone="attention" title={`Computed by solver ${row.result.solver}`} still>
          {`Floods are routed by solver ${solver} today. Run the case again to see what it is worth.`}
        </Notice>
      ) : null}
      {result ? (
        <>
          <CurvesCard title={row.title} curves={result.curves} quantity="stage" />
          <CurvesCard title={row.title} curves={result.curves} quantity="flow" />
          <VerdictCard row={row} criteria={result.criteria} />
          <GridsCard grids={result.grids} />
        </>
      ) : goesOn(row) ? (
        <Loading what="The case is being routed on the queue…" />
      ) : (
        <Empty title="Not run yet">
          Run it: it is routed on all its grids within seconds, and what is computed stands here
          beside what is right.
        </Empty>
      )}
    </>
  );
}

function RunThis({ row }: { row: VerificationCaseRow }) {
  const run = useRunCases();
  const isGoing = goesOn(row);
  return (
    <>
      {run.error ? <ErrorState error={run.error} title="The case was not begun" /> : null}
      <Button
        kind="solid"
        label={isGoing ? 'Under way' : row.result ? 'Run again' : 'Run it'}
        busy={run.isPending || isGoing}
        onPress={() => run.mutate([row.id])}
      />
    </>
  );
}
