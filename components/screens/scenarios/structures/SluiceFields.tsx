import { FieldRow } from '../EditorPart';
import { TimeTableEditor } from '../TimeTableEditor';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** A gate over a sill. */
export function SluiceFields() {
  const { structure, path, change } = useStructure('sluice');
  return (
    <>
      <FieldRow>
        <StructureNumber
          path={`${path}.width`}
          label="Clear width"
          hint="Of all gates together."
          quantity="length"
          value={structure.width}
          onChange={(width) => change({ width })}
        />
        <StructureNumber
          path={`${path}.sill`}
          label="Sill level"
          hint="Above datum."
          quantity="elevation"
          value={structure.sill}
          onChange={(sill) => change({ sill })}
        />
        <StructureNumber
          path={`${path}.contraction`}
          label="Coefficient of contraction"
          optional
          hint="Empty: 0.611 of a sharp vertical gate; 0.6 to 0.75 for radial ones (Henderson 1966)."
          value={structure.contraction}
          onChange={(contraction) => change({ contraction })}
        />
      </FieldRow>
      <TimeTableEditor
        path={path}
        label="Opening above the sill"
        quantity="opening"
        times={structure.times}
        values={structure.openings}
        onChange={(times, openings) => change({ times, openings })}
      />
    </>
  );
}
