import { SelectField } from '@/components/ui/SelectField';
import { PIER_SHAPE_NAMES } from '@/shared/case/structures';
import { PIER_WORDS } from '@/shared/structures/structureWords';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { CrestEditor } from './CrestEditor';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** Piers, soffit and deck. */
export function BridgeFields() {
  const { structure, path, change, disabled } = useStructure('bridge');
  return (
    <>
      <PlacedField path={`${path}.piers`}>
        {(error) => (
          <SelectField
            label="Piers"
            hint="Sets Yarnell's coefficient, 0.90 to 2.50 (Yarnell 1934)."
            value={structure.piers}
            options={PIER_SHAPE_NAMES.map((value) => ({ value, label: PIER_WORDS[value] }))}
            onChange={(piers) => change({ piers })}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <FieldRow>
        <StructureNumber
          path={`${path}.obstructed`}
          label="Share taken by the piers"
          hint="Of the flow area, 0 to 0.5; most bridges 0.02 to 0.10 (common practice)."
          value={structure.obstructed}
          onChange={(obstructed) => change({ obstructed })}
        />
        <StructureNumber
          path={`${path}.soffit`}
          label="Soffit level"
          hint="Underside of the deck, above datum."
          quantity="elevation"
          value={structure.soffit}
          onChange={(soffit) => change({ soffit })}
        />
        <StructureNumber
          path={`${path}.contraction`}
          label="Coefficient of contraction"
          optional
          hint="Of the flow pressed under the deck. Empty: 0.611."
          value={structure.contraction}
          onChange={(contraction) => change({ contraction })}
        />
        <StructureNumber
          path={`${path}.deckCoefficient`}
          label="Coefficient over the deck"
          optional
          hint="C_d of a broad crest. Empty: 1. Rails and parapets lower it."
          value={structure.deckCoefficient}
          onChange={(deckCoefficient) => change({ deckCoefficient })}
        />
      </FieldRow>
      <CrestEditor
        path={path}
        label="Top of the deck (optional)"
        crest={structure}
        onChange={change}
      />
    </>
  );
}
