import { RadioGroup } from '@/components/ui/RadioGroup';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { TimeField } from '../TimeField';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** What makes the dam fail, how, and between which levels. */
export function BreachStart() {
  const { structure, path, change, disabled } = useStructure('breach');
  const { trigger, mode } = structure;
  return (
    <>
      <PlacedField path={`${path}.mode`}>
        {(error) => (
          <RadioGroup
            label="How it fails"
            value={mode}
            onChange={(chosen) => change({ mode: chosen, estimate: '' })}
            options={[
              {
                value: 'overtopping',
                label: 'Overtopping',
                hint: 'A cut that grows down from the crest.',
              },
              {
                value: 'piping',
                label: 'Piping',
                hint: 'A pipe through the dam that grows until its roof falls.',
              },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <PlacedField path={`${path}.trigger`}>
        {(error) => (
          <RadioGroup
            label="When it begins"
            value={trigger}
            onChange={(chosen) => change({ trigger: chosen })}
            options={[
              { value: 'stage', label: 'When the water above it reaches a stage' },
              { value: 'time', label: 'At a time' },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <FieldRow>
        {trigger === 'stage' ? (
          <StructureNumber
            path={`${path}.triggerStage`}
            label="Stage at failure"
            hint="Of the water above the dam, above datum."
            quantity="elevation"
            value={structure.triggerStage}
            onChange={(triggerStage) => change({ triggerStage })}
          />
        ) : (
          <PlacedField path={`${path}.triggerTime`} half>
            {(error) => (
              <TimeField
                label="Time of failure"
                hint="From the start of the run."
                unit="h"
                value={structure.triggerTime}
                onChange={(triggerTime) => change({ triggerTime })}
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        )}
        <StructureNumber
          path={`${path}.startLevel`}
          label={mode === 'piping' ? 'Level of the pipe' : 'Level where it begins'}
          optional={mode === 'overtopping'}
          hint={mode === 'piping' ? 'Where the pipe begins.' : 'Empty: the crest at its middle.'}
          quantity="elevation"
          value={structure.startLevel}
          onChange={(startLevel) => change({ startLevel })}
        />
        <StructureNumber
          path={`${path}.bottomLevel`}
          label="Bottom of the full breach"
          hint="The bed at the dam, as a rule."
          quantity="elevation"
          value={structure.bottomLevel}
          onChange={(bottomLevel) => change({ bottomLevel })}
        />
        <StructureNumber
          path={`${path}.centre`}
          label="Offset of its middle"
          optional
          hint="Empty: the middle of the crest."
          quantity="length"
          value={structure.centre}
          onChange={(centre) => change({ centre })}
        />
      </FieldRow>
    </>
  );
}
