import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { Loading } from '@/components/ui/Loading';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunResiduals } from '@/shared/calibration/types';
import type { Run } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { floodName, signed } from '../../calibration/floodWords';
import type { ObservedFloodChoice } from './useObservedFlood';

interface Props {
  run: Run;
  observed: ObservedFloodChoice;
  store: PlaceAndTimeStore;
}

const NO_FLOOD = 'none';

/** Which observed flood the drawings show beside what was computed. */
export function ObservedCard({ run, observed, store }: Props) {
  const system = useUnitSystem();
  const { floods, chosen, residuals, error, retry, choose } = observed;
  const gauges = residuals ? gaugesOf(residuals) : [];
  return (
    <Card title="Observed">
      <SelectField
        label="Flood to draw beside this run"
        value={chosen === null ? NO_FLOOD : String(floods.indexOf(chosen))}
        options={[
          { value: NO_FLOOD, label: 'None' },
          ...floods.map((flood, k) => ({ value: String(k), label: floodName(flood) })),
        ]}
        onChange={(value) => choose(value === NO_FLOOD ? null : floods[Number(value)])}
      />
      {error ? (
        <ErrorState error={error} title="What was observed could not be read" retry={retry} />
      ) : null}
      {chosen !== null && !residuals && !error ? (
        <Loading what="Comparing with what was observed…" />
      ) : null}
      {residuals ? (
        <>
          <Txt>{marksSentence(residuals, system)}</Txt>
          {gauges.length > 0 ? (
            <ButtonRow>
              {gauges.map(({ gaugeId, name, chainage }) => {
                const label = `${name}, ${formatWithUnit(chainage, 'chainage', system)}`;
                return (
                  <Button
                    key={gaugeId}
                    kind="quiet"
                    label={label}
                    name={`Show the record of ${label}`}
                    onPress={() => store.setAt(chainage)}
                  />
                );
              })}
            </ButtonRow>
          ) : null}
          <LinkTxt
            href={{
              pathname: '/studies/[studyId]/calibration/runs/[runId]',
              params: { studyId: run.studyId, runId: run.id, flood: residuals.flood },
            }}
          >
            All residuals
          </LinkTxt>
        </>
      ) : null}
    </Card>
  );
}

/** Each gauge whose record can be laid beside the run, once. */
const gaugesOf = ({ gauges }: RunResiduals) =>
  gauges.filter(
    ({ gaugeId, series }, k) =>
      series && gauges.findIndex((other) => other.series && other.gaugeId === gaugeId) === k,
  );

function marksSentence({ marks, all }: RunResiduals, system: Parameters<typeof formatWithUnit>[2]) {
  if (marks.length === 0) return 'Of this flood there are records of gauges, and no marks.';
  if (!all) return 'None of its marks lies on water of this run.';
  const { count, within, mean } = all;
  const leaning = signed(formatWithUnit(mean, 'depth', system), mean);
  const left = marks.length - count;
  return (
    `${within} of ${count} marks within their tolerance, mean error ${leaning} (computed less observed).` +
    (left > 0 ? ` ${left} cannot be compared: off the reach, or dry in this run.` : '')
  );
}
