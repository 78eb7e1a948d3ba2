import { RadioGroup } from '@/components/ui/RadioGroup';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { CrestEditor } from './CrestEditor';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** A crest across the river. */
export function WeirFields() {
  const { structure, path, change, disabled } = useStructure('weir');
  const { form, coefficient } = structure;
  return (
    <>
      <PlacedField path={`${path}.form`}>
        {(error) => (
          <RadioGroup
            label="Crest"
            value={form}
            onChange={(chosen) => change({ form: chosen })}
            options={[
              {
                value: 'broad',
                label: 'Broad',
                hint: 'Long enough in the direction of flow for critical depth on it.',
              },
              { value: 'sharp', label: 'Sharp', hint: 'A thin plate or edge.' },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <FieldRow>
        <StructureNumber
          path={`${path}.coefficient`}
          label="Discharge coefficient"
          optional
          hint={
            form === 'broad'
              ? 'C_d on the energy head. Empty: 1. Usually 0.85 to 1.05 (Bos 1989).'
              : 'C_d on the head. Empty: 0.611 + 0.08 h/P (Rehbock; Henderson 1966).'
          }
          value={coefficient}
          onChange={(value) => change({ coefficient: value })}
        />
      </FieldRow>
      <CrestEditor path={path} label="Crest" crest={structure} onChange={change} />
    </>
  );
}
