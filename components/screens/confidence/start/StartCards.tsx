import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useConfidenceOptions } from '@/components/queries/confidence';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { Checkbox } from '@/components/ui/Checkbox';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { CONFIDENCE_LIMITS } from '@/shared/confidence/schemas';
import type { ConfidenceOptions } from '@/shared/confidence/types';
import type { RunRow } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { ConvergenceForm } from './ConvergenceForm';
import { EnsembleForm } from './EnsembleForm';
import { SensitivityForm } from './SensitivityForm';

interface Props {
  runs: readonly RunRow[];
  run: RunRow;
  onChoose: (runId: number) => void;
}

/** Of which run, at which stations; then the three sets, a button each. */
export function StartCards({ runs, run, onChoose }: Props) {
  const options = useConfidenceOptions(run.id);
  return (
    <>
      <Card title="Compute a set">
        <SelectField
          label="Of the run"
          value={String(run.id)}
          options={runs.map(({ id, number, scenarioName }) => ({
            value: String(id),
            label: `Run ${number}, ${scenarioName}`,
          }))}
          onChange={(id) => onChoose(Number(id))}
        />
        {options.isPending ? <Loading what="Reading the run…" /> : null}
        {options.error ? (
          <ErrorState
            error={options.error}
            title="The run could not be read"
            retry={() => void options.refetch()}
          />
        ) : null}
      </Card>
      {options.data ? <Sets key={run.id} run={run} options={options.data} /> : null}
    </>
  );
}

function Sets({ run, options }: { run: RunRow; options: ConfidenceOptions }) {
  const [stationIds, setStationIds] = useState(() =>
    options.stations.slice(0, CONFIDENCE_LIMITS.stations).map(({ stationId }) => stationId),
  );
  const common = { runId: run.id, options, stationIds };
  return (
    <>
      <StationsField options={options} chosen={stationIds} onChange={setStationIds} />
      <ConvergenceForm {...common} />
      <SensitivityForm {...common} />
      <EnsembleForm {...common} />
    </>
  );
}

function StationsField(props: {
  options: ConfidenceOptions;
  chosen: readonly number[];
  onChange: (chosen: number[]) => void;
}) {
  const { options, chosen, onChange } = props;
  const system = useUnitSystem();
  const full = chosen.length >= CONFIDENCE_LIMITS.stations;
  if (options.stations.length === 0)
    return (
      <Card title="At which places">
        <Txt tone="soft">
          The study has no stations on this reach. Hydrographs and tables are told for the last
          section; peaks are kept all along the reach.
        </Txt>
      </Card>
    );
  return (
    <Card
      title="At which stations"
      aside={`${chosen.length} chosen, at most ${CONFIDENCE_LIMITS.stations}`}
    >
      <View style={styles.stations}>
        {options.stations.map(({ stationId, name, chainage }) => {
          const isChosen = chosen.includes(stationId);
          return (
            <Checkbox
              key={stationId}
              label={`${name}, ${formatWithUnit(chainage, 'chainage', system)}`}
              checked={isChosen}
              disabled={!isChosen && full}
              onChange={(on) =>
                onChange(on ? [...chosen, stationId] : chosen.filter((id) => id !== stationId))
              }
            />
          );
        })}
      </View>
      {chosen.length === 0 ? (
        <Txt variant="small" tone="soft">
          Without a station the last section is told.
        </Txt>
      ) : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  stations: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.three },
});
