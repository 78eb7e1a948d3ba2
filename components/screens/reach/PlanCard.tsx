import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { ChartBox } from '@/components/charts/ChartBox';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { downloadReachPlan, downloadRunPlan, useRunPlan } from '@/components/queries/geometries';
import { useRuns } from '@/components/queries/runs';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import type { Reach, ReachSection } from '@/shared/reaches/types';
import { extentRings } from './extentRings';
import { PlanDrawing } from './PlanDrawing';

interface PlanCardProps {
  reach: Reach;
  section: ReachSection;
  onChoose: (chainage: number) => void;
}

/** The reach from above, where the survey gave coordinates; with the widest water of a run where one is chosen. */
export function PlanCard({ reach, section, onChoose }: PlanCardProps) {
  const { study, may } = useCurrentStudy();
  const { sections } = reach;
  const placed = useMemo(() => sections.filter(({ coordinates }) => coordinates), [sections]);
  const [runId, setRunId] = useState<number | null>(null);
  const runs = useRuns(study.id).data ?? [];
  const routed = runs.filter(({ state }) => state === 'routed');
  const plan = useRunPlan(study.coordinateSystem === '' ? null : runId);
  const rings = useMemo(() => extentRings(plan.data), [plan.data]);
  const [isNear, setIsNear] = useState(false);
  const inView = useMemo(
    () => (isNear ? neighboursOf(placed, section) : placed),
    [isNear, placed, section],
  );
  if (placed.length < 2) return null;
  const missing = sections.length - placed.length;
  const isNamed = study.coordinateSystem !== '';
  return (
    <Card title="Plan" aside={missing > 0 ? `without coordinates: ${missing}` : 'north is up'}>
      <ChartBox
        label={`The reach from above, ${placed.length} sections; ${section.id} is chosen${rings.length > 0 ? '; the widest water of the run is drawn between them' : ''}`}
        height={260}
      >
        {(size) => <PlanDrawing {...{ placed, inView, section, rings, size, onChoose }} />}
      </ChartBox>
      <View style={styles.view}>
        <Button
          kind="quiet"
          label={isNear ? 'Whole reach' : `Around ${section.id}`}
          onPress={() => setIsNear(!isNear)}
        />
      </View>
      {isNamed && may('run.read') && routed.length > 0 ? (
        <SelectField
          label="Widest water of a run"
          value={String(runId ?? '')}
          options={[
            { value: '', label: 'None' },
            ...routed.map(({ id, number, scenarioName }) => ({
              value: String(id),
              label: `Run ${number}, ${scenarioName}`,
            })),
          ]}
          onChange={(value) => setRunId(value === '' ? null : Number(value))}
        />
      ) : null}
      {plan.error ? <ErrorState title="The run cannot be drawn" error={plan.error} /> : null}
      {plan.data?.notes.slice(1).map((note) => (
        <Txt key={note} variant="small" tone="ochre">
          {note}
        </Txt>
      ))}
      <Txt variant="small" tone="soft">
        {isNamed
          ? `Coordinates: ${study.coordinateSystem}. The GeoJSON file names it and gives them as they are, not as longitude and latitude of WGS 84, which RFC 7946 expects: tell the program that reads it.`
          : 'The study does not name its coordinate system. Name it under Study, then the plan can be taken as GeoJSON and a run be drawn in it.'}
      </Txt>
      <Button
        label={runId === null ? 'Plan as GeoJSON' : 'Plan and water as GeoJSON'}
        disabled={!isNamed}
        onPress={() => void (runId === null ? downloadReachPlan(reach.id) : downloadRunPlan(runId))}
      />
    </Card>
  );
}

/** Sections on either side of the one shown when the plan is seen from near. */
const AROUND = 3;

function neighboursOf(placed: readonly ReachSection[], { chainage }: ReachSection) {
  const at = placed.findIndex((one) => one.chainage >= chainage);
  const middle = at < 0 ? placed.length - 1 : at;
  return placed.slice(Math.max(0, middle - AROUND), middle + AROUND + 1);
}

const styles = StyleSheet.create({ view: { marginVertical: -space.one } });
