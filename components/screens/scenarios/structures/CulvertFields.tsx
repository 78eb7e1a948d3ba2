import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { CULVERT_INLET_NAMES } from '@/shared/case/structures';
import { CULVERT_INLET_WORDS } from '@/shared/structures/structureWords';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { CrestEditor } from './CrestEditor';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** The usual inlet of each shape, taken where the shape changes. */
const FIRST_INLET = { circular: 'concretePipeSquareEdge', box: 'boxWingwalls30to75' } as const;

/** Barrels under a road. */
export function CulvertFields() {
  const { structure, path, change, disabled } = useStructure('culvert');
  const { shape, inlet } = structure;
  const inlets = CULVERT_INLET_NAMES.filter((name) => name.startsWith('box') === (shape === 'box'));
  return (
    <>
      <PlacedField path={`${path}.shape`}>
        {(error) => (
          <RadioGroup
            label="Barrel"
            value={shape}
            onChange={(chosen) => change({ shape: chosen, inlet: FIRST_INLET[chosen] })}
            options={[
              { value: 'circular', label: 'Circular pipe' },
              { value: 'box', label: 'Box' },
            ]}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <PlacedField path={`${path}.inlet`}>
        {(error) => (
          <SelectField
            label="Inlet"
            hint="Sets the constants of inlet control and of the entrance loss (FHWA HDS-5, 2012)."
            value={inlet}
            options={inlets.map((value) => ({ value, label: CULVERT_INLET_WORDS[value] }))}
            onChange={(chosen) => change({ inlet: chosen })}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
      <FieldRow>
        {shape === 'circular' ? (
          <StructureNumber
            path={`${path}.diameter`}
            label="Diameter"
            hint="Inside."
            quantity="depth"
            value={structure.diameter}
            onChange={(diameter) => change({ diameter })}
          />
        ) : (
          <>
            <StructureNumber
              path={`${path}.width`}
              label="Width"
              hint="Inside."
              quantity="depth"
              value={structure.width}
              onChange={(width) => change({ width })}
            />
            <StructureNumber
              path={`${path}.height`}
              label="Height"
              hint="Inside."
              quantity="depth"
              value={structure.height}
              onChange={(height) => change({ height })}
            />
          </>
        )}
        <StructureNumber
          path={`${path}.barrels`}
          label="Barrels"
          hint="Alike, side by side."
          value={structure.barrels}
          onChange={(barrels) => change({ barrels })}
        />
        <StructureNumber
          path={`${path}.n`}
          label="Manning's n"
          hint="Concrete 0.011 to 0.015, corrugated metal 0.021 to 0.030 (Chow 1959)."
          value={structure.n}
          onChange={(n) => change({ n })}
        />
        <StructureNumber
          path={`${path}.length`}
          label="Length"
          hint="From inlet to outlet."
          quantity="length"
          value={structure.length}
          onChange={(length) => change({ length })}
        />
        <StructureNumber
          path={`${path}.invertUp`}
          label="Invert upstream"
          hint="Above datum."
          quantity="elevation"
          value={structure.invertUp}
          onChange={(invertUp) => change({ invertUp })}
        />
        <StructureNumber
          path={`${path}.invertDown`}
          label="Invert downstream"
          hint="Above datum."
          quantity="elevation"
          value={structure.invertDown}
          onChange={(invertDown) => change({ invertDown })}
        />
        <StructureNumber
          path={`${path}.crestCoefficient`}
          label="Coefficient over the road"
          optional
          hint="C_d of a broad crest. Empty: 1. Paved roads usually 0.9 to 1.0 (FHWA HDS-5)."
          value={structure.crestCoefficient}
          onChange={(crestCoefficient) => change({ crestCoefficient })}
        />
      </FieldRow>
      <CrestEditor
        path={path}
        label="Road over the culvert (optional)"
        crest={structure}
        onChange={change}
      />
    </>
  );
}
