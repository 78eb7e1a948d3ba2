import { useMemo } from 'react';
import { Hydrograph } from '@/components/charts/Hydrograph';
import { NumberField } from '@/components/ui/NumberField';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import {
  generateHydrograph,
  volumeOf,
  type GeneratedInflow as GeneratedShape,
} from '@/shared/scenarios/hydrographs';
import { formatDuration } from '@/shared/units/format';
import { FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { TimeField } from './TimeField';
import { spokenVolume } from './spokenVolume';

interface GeneratedInflowProps {
  /** Path of the inflow in the body, e.g. `upstream`. */
  path: string;
  inflow: GeneratedShape;
  onChange: (change: Partial<GeneratedShape>) => void;
}

/** A flood by its shape, drawn while its numbers are typed. */
export function GeneratedInflow({ path, inflow, onChange: change }: GeneratedInflowProps) {
  const { isLocked: disabled } = useEditing();
  const system = useUnitSystem();
  const flood = useMemo(() => generateHydrograph(inflow), [inflow]);
  const series = useMemo(() => flood && { times: flood.times, values: flood.flows }, [flood]);
  return (
    <>
      <PlacedField path={`${path}.shape`}>
        {(error) => (
          <SelectField
            label="Shape"
            value={inflow.shape}
            disabled={disabled}
            error={error}
            options={[
              { value: 'nrcs', label: 'NRCS dimensionless unit hydrograph' },
              { value: 'gamma', label: 'Gamma' },
              { value: 'triangle', label: 'Triangle' },
            ]}
            onChange={(shape) => change({ shape })}
          />
        )}
      </PlacedField>
      <FieldRow>
        <PlacedField path={`${path}.peakFlow`} half>
          {(error) => (
            <NumberField
              label="Peak flow"
              hint="Base flow included."
              quantity="flow"
              value={inflow.peakFlow}
              onChange={(peakFlow) => change({ peakFlow })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.timeToPeak`} half>
          {(error) => (
            <TimeField
              label="Time to peak"
              hint="From the start of the run."
              unit="h"
              value={inflow.timeToPeak}
              onChange={(timeToPeak) => change({ timeToPeak })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.baseFlow`} half>
          {(error) => (
            <NumberField
              label="Base flow"
              hint="Before the flood, and after it."
              quantity="flow"
              value={inflow.baseFlow}
              onChange={(baseFlow) => change({ baseFlow })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        {inflow.shape === 'triangle' ? (
          <PlacedField path={`${path}.recessionRatio`} half>
            {(error) => (
              <NumberField
                label="Recession over rise"
                hint="1.67 is the usual triangle."
                value={inflow.recessionRatio}
                onChange={(recessionRatio) => change({ recessionRatio })}
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        ) : null}
        {inflow.shape === 'gamma' ? (
          <PlacedField path={`${path}.gammaExponent`} half>
            {(error) => (
              <NumberField
                label="Exponent"
                hint="3.7 comes close to the NRCS shape; more is peakier."
                value={inflow.gammaExponent}
                onChange={(gammaExponent) => change({ gammaExponent })}
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        ) : null}
      </FieldRow>
      {flood && series ? (
        <>
          <Hydrograph label="Inflow" quantity="flow" series={series} t={null} unitSystem={system} />
          <Txt variant="small" tone="soft">
            {`${spokenVolume(volumeOf(flood), system)} in ${formatDuration(flood.times[flood.times.length - 1])}, base flow included.`}
          </Txt>
        </>
      ) : (
        <Txt tone="soft">The flood is drawn here as soon as its three numbers are there.</Txt>
      )}
    </>
  );
}
