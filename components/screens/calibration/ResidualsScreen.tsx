import { useLocalSearchParams, useRouter } from 'expo-router';
import { pictureOfRun } from '@/components/charts/picture/pictureSources';
import { Cautions } from '@/components/layout/Cautions';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useResiduals, useResidualsDownload } from '@/components/queries/calibration';
import { useObservations } from '@/components/queries/observations';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SelectField } from '@/components/ui/SelectField';
import type { Run } from '@/shared/runs/types';
import { RunGate } from '../runs/RunGate';
import { floodName } from './floodWords';
import { GaugeFitCard } from './GaugeFitCard';
import { MarksAlongCard } from './MarksAlongCard';
import { MarkResidualsCard } from './MarkResidualsCard';
import { ReportedCard } from './ReportedCard';
import { ResidualFigures } from './ResidualFigures';
import { ResidualGroupsCard } from './ResidualGroupsCard';

/** A run against what was observed of a flood. */
export const ResidualsScreen = () => (
  <RunGate title="Observed against computed">{(run) => <Against key={run.id} run={run} />}</RunGate>
);

function Against({ run }: { run: Run }) {
  const { study, may } = useCurrentStudy();
  const { isWide } = useBreakpoint();
  const router = useRouter();
  const params = useLocalSearchParams<{ flood?: string }>();
  const observed = useObservations(study.id);
  const wanted = params.flood ?? null;
  const { data, error, refetch } = useResiduals(run.id, wanted);
  const download = useResidualsDownload(run.id);
  const floods = observed.data?.floods ?? [];
  const hasSome = data && (data.marks.length > 0 || data.gauges.length > 0);
  const root = `/studies/${study.id}/calibration` as const;
  return (
    <Screen
      title={`Run ${run.number} against the observed`}
      crumbs={[
        { label: study.title, href: `/studies/${study.id}` },
        { label: 'Calibration', href: root },
        { label: `Run ${run.number}`, href: `/studies/${study.id}/runs/${run.id}` },
      ]}
      picture={pictureOfRun(run)}
      lead={`${run.scenarioName}. Residuals are computed less observed: above zero the model stands too high.`}
      actions={
        hasSome ? (
          <>
            <Button
              label="Residuals as CSV"
              busy={download.isPending}
              onPress={() => download.mutate(data.flood)}
            />
            {may('run.request') ? (
              <Button
                kind="solid"
                label="Search for roughness"
                href={{
                  pathname: `/studies/[studyId]/calibration/runs/[runId]/search`,
                  params: { studyId: study.id, runId: run.id, flood: data.flood },
                }}
              />
            ) : null}
          </>
        ) : undefined
      }
      side={
        hasSome && isWide ? (
          <>
            <ResidualFigures residuals={data} />
            <ReportedCard run={run} residuals={data} />
          </>
        ) : undefined
      }
    >
      {floods.length > 1 && data ? (
        <SelectField
          label="Flood"
          value={data.flood}
          options={floods.map((flood) => ({ value: flood, label: floodName(flood) }))}
          onChange={(flood) => router.setParams({ flood })}
        />
      ) : null}
      {error && !data ? (
        <ErrorState
          error={error}
          title="The residuals could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {download.error ? (
        <ErrorState error={download.error} title="The file could not be saved" />
      ) : null}
      {!data && !error ? <Loading what="Comparing with what was observed…" /> : null}
      {data && !hasSome ? (
        <Empty
          title="Nothing observed to compare with"
          action={<Button label="Add marks or a gauge record" href={root} />}
        >
          Marks and gauge records belong to the study. Once there are some, this run is compared
          with them.
        </Empty>
      ) : null}
      {hasSome ? (
        <>
          {isWide ? null : <ResidualFigures residuals={data} />}
          {data.marks.length > 0 ? (
            <>
              <MarksAlongCard run={run} residuals={data} />
              <MarkResidualsCard marks={data.marks} />
              <ResidualGroupsCard residuals={data} />
            </>
          ) : null}
          {data.gauges.map((fit) => (
            <GaugeFitCard key={`${fit.gaugeId} ${fit.quantity}`} fit={fit} run={run} />
          ))}
          {isWide ? null : <ReportedCard run={run} residuals={data} />}
        </>
      ) : null}
      <Cautions />
    </Screen>
  );
}
