import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatWithUnit } from '@/shared/units/format';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { TimeField } from '../TimeField';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** The breach that is routed. Own numbers stand for themselves: they are of no estimate any more. */
export function BreachOpening() {
  const { structure, path, change, disabled } = useStructure('breach');
  const system = useUnitSystem();
  return (
    <>
      <Txt strong heading={4}>
        The breach that is routed
      </Txt>
      <FieldRow>
        <StructureNumber
          path={`${path}.bottomWidth`}
          label="Width at the bottom"
          hint="Of the full breach."
          quantity="length"
          value={structure.bottomWidth}
          onChange={(bottomWidth) => change({ bottomWidth, estimate: '' })}
        />
        <StructureNumber
          path={`${path}.sideSlope`}
          label="Side slope"
          hint="Horizontal to 1 vertical; 0: upright."
          value={structure.sideSlope}
          onChange={(sideSlope) => change({ sideSlope, estimate: '' })}
        />
        <PlacedField path={`${path}.formationTime`} half>
          {(error) => (
            <TimeField
              label="Formation time"
              hint="From its beginning to its full size; 0: at once."
              unit="min"
              value={structure.formationTime}
              onChange={(formationTime) => change({ formationTime, estimate: '' })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <StructureNumber
          path={`${path}.weirCoefficient`}
          label="Weir coefficient"
          optional
          hint={`C of Q = C b h^1.5. Empty: that of a broad crest, ${formatWithUnit(1.7, 'weirCoefficient', system)}.`}
          quantity="weirCoefficient"
          value={structure.weirCoefficient}
          onChange={(weirCoefficient) => change({ weirCoefficient })}
        />
        {structure.mode === 'piping' ? (
          <StructureNumber
            path={`${path}.orificeCoefficient`}
            label="Orifice coefficient"
            optional
            hint="Of the pipe. Empty: 0.6."
            value={structure.orificeCoefficient}
            onChange={(orificeCoefficient) => change({ orificeCoefficient })}
          />
        ) : null}
      </FieldRow>
      <PlacedField path={`${path}.growth`}>
        {(error) => (
          <RadioGroup
            label="How it grows"
            value={structure.growth}
            onChange={(growth) => change({ growth })}
            options={[
              { value: 'sine', label: 'Slowly at first and at last', hint: 'Along half a sine.' },
              { value: 'linear', label: 'Evenly' },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
    </>
  );
}
