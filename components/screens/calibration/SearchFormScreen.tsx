import { useLocalSearchParams, useRouter } from 'expo-router';
import { FormCheckbox } from '@/components/forms/FormCheckbox';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSelectField } from '@/components/forms/FormSelectField';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRequestSearch, useResiduals } from '@/components/queries/calibration';
import { useRunSummary } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { GAUGE_STAGE_TOLERANCE } from '@/shared/calibration/marks';
import type { RunResiduals } from '@/shared/calibration/types';
import { searchSchema, SEARCH_LIMITS } from '@/shared/calibration/search/schemas';
import type { Run, RunSummary } from '@/shared/runs/types';
import { formatChosenLength, formatWithUnit } from '@/shared/units/format';
import { RunGate } from '../runs/RunGate';
import { floodName } from './floodWords';
import { firstCells, firstStretches } from './searchForm';
import { SearchCost } from './SearchCost';
import { StretchFields } from './StretchFields';

/** Asks for a search of roughness multipliers. */
export const SearchFormScreen = () => (
  <RunGate title="Search for roughness">{(run) => <Reading key={run.id} run={run} />}</RunGate>
);

function Reading({ run }: { run: Run }) {
  const { flood } = useLocalSearchParams<{ flood?: string }>();
  const residuals = useResiduals(run.id, flood ?? null);
  const summary = useRunSummary(run.id);
  const error = residuals.error ?? summary.error;
  if (residuals.data && summary.data)
    return <Form run={run} residuals={residuals.data} summary={summary.data} />;
  return (
    <Screen title="Search for roughness">
      {error ? (
        <ErrorState error={error} title="The run could not be read" />
      ) : (
        <Loading what="Reading the run…" />
      )}
    </Screen>
  );
}

interface Props {
  run: Run;
  residuals: RunResiduals;
  summary: RunSummary;
}

const COARSER = [1, 2, 4, 8] as const;

function Form({ run, residuals, summary }: Props) {
  const { study } = useCurrentStudy();
  const router = useRouter();
  const request = useRequestSearch(run.id);
  const { flood, marks, gauges } = residuals;
  const has = (quantity: 'stage' | 'flow') => gauges.some((fit) => fit.quantity === quantity);
  const form = useYupForm({
    schema: searchSchema,
    initial: {
      name: `Roughness, ${floodName(flood)}`.slice(0, 120),
      flood,
      use: { marks: marks.length > 0, gaugeStage: has('stage'), gaugeFlow: false },
      stretches: firstStretches(summary.sections),
      evaluations: 40 as number | null,
      coarser: firstCells(summary.seconds),
    },
    onSubmit: async (body) => {
      const { id } = await request.mutateAsync({ ...body, coarser: Number(body.coarser) });
      router.replace(`/studies/${study.id}/calibration/searches/${id}`);
    },
  });
  const { evaluations, stretches, coarser } = form.formik.values;
  const cell = (times: number) => formatChosenLength(summary.cellSize * times, study.unitSystem);
  const root = `/studies/${study.id}` as const;
  return (
    <Screen
      title="Search for roughness"
      crumbs={[
        { label: study.title, href: root },
        { label: 'Calibration', href: `${root}/calibration` },
        { label: `Run ${run.number}`, href: `${root}/calibration/runs/${run.id}` },
      ]}
      lead={`The flood of run ${run.number} is routed again and again with other multipliers of Manning’s n, until the misfit against ${floodName(flood)} no longer falls. Nothing is applied: you decide what becomes of the result.`}
      narrow
    >
      <FormRoot form={form} label="Search for roughness" failedTitle="Not started">
        <Card title="Search">
          <FormTextField name="name" label="Name" maxLength={120} />
          <div role="group" aria-label="What it fits">
            {marks.length > 0 ? (
              <FormCheckbox
                name="use.marks"
                label={`Marks, ${marks.length}`}
                hint="Each by its residual over its tolerance."
              />
            ) : null}
            {has('stage') ? (
              <FormCheckbox
                name="use.gaugeStage"
                label="Stage of the gauges"
                hint={`Each by its root mean square error over ${formatWithUnit(GAUGE_STAGE_TOLERANCE, 'depth', study.unitSystem)}.`}
              />
            ) : null}
            {has('flow') ? (
              <FormCheckbox
                name="use.gaugeFlow"
                label="Flow of the gauges"
                hint="Each by its root mean square error over a tenth of its peak."
              />
            ) : null}
          </div>
          <Txt variant="small" tone="soft">
            The misfit is the root of the mean square of these: 1 means off by the tolerance on
            average.
          </Txt>
        </Card>
        <StretchFields sections={summary.sections} />
        <Card title="Effort">
          <FormNumberField
            name="evaluations"
            label="Runs at most"
            hint={`${SEARCH_LIMITS.evaluations.min} to ${SEARCH_LIMITS.evaluations.max}; about 20 for each multiplier is usual.`}
          />
          <FormSelectField
            name="coarser"
            label="Cells"
            hint="Coarser cells are quicker and less exact. The scenario that you make of the result keeps its own."
            options={COARSER.map((times) => ({
              value: String(times),
              label:
                times === 1
                  ? `As in the run, ${cell(1)}`
                  : `${times} times as long, ${cell(times)}`,
            }))}
          />
          <SearchCost
            seconds={summary.seconds}
            coarser={Number(coarser)}
            runs={(evaluations ?? 0) + 4 * stretches.length}
          />
          <FormSubmit label="Start the search" />
        </Card>
      </FormRoot>
    </Screen>
  );
}
