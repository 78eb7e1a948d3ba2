import { Button } from '@/components/ui/Button';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { Txt } from '@/components/ui/Txt';
import { damDataOf } from '@/shared/scenarios/structures/damData';
import type { DamData } from '@/shared/scenarios/structures/schemas';
import { FieldRow } from '../EditorPart';
import { PlacedField } from '../PlacedField';
import { StructureNumber } from './StructureNumber';
import { useStructure } from './structureContext';

/** Dam and reservoir as the published regressions ask for them. */
export function DamFields() {
  const { structure, path, change, upstream, reach, disabled } = useStructure('breach');
  const { dam } = structure;
  const set = (to: Partial<DamData>) => change({ dam: { ...dam, ...to } });
  const told = reach ? rounded(damDataOf(structure, upstream, reach.sections)) : {};
  const isTold = Object.keys(told).length > 0;
  return (
    <>
      <Txt strong heading={4}>
        The dam for the published regressions
      </Txt>
      {disabled || !isTold ? null : (
        <Button
          kind="quiet"
          label="Take from crest and reservoir"
          hint={
            told.waterVolume === undefined
              ? 'Heights only: the water above the dam is not known yet.'
              : undefined
          }
          onPress={() => set(told)}
        />
      )}
      <FieldRow>
        <StructureNumber
          path={`${path}.dam.waterDepth`}
          label="Depth of water at failure"
          hint="Above the bottom of the breach."
          quantity="depth"
          value={dam.waterDepth}
          onChange={(waterDepth) => set({ waterDepth })}
        />
        <StructureNumber
          path={`${path}.dam.waterVolume`}
          label="Volume of water at failure"
          hint="Above the bottom of the breach."
          quantity="storage"
          value={dam.waterVolume}
          onChange={(waterVolume) => set({ waterVolume })}
        />
        <StructureNumber
          path={`${path}.dam.storage`}
          label="Storage of the reservoir"
          optional
          hint="Empty: the volume at failure."
          quantity="storage"
          value={dam.storage}
          onChange={(storage) => set({ storage })}
        />
        <StructureNumber
          path={`${path}.dam.height`}
          label="Height of the dam"
          optional
          hint="Empty: that of the breach."
          quantity="depth"
          value={dam.height}
          onChange={(height) => set({ height })}
        />
        <StructureNumber
          path={`${path}.dam.crestWidth`}
          label="Width of the crest"
          optional
          hint="In the direction of flow; for the eroded volume."
          quantity="depth"
          value={dam.crestWidth}
          onChange={(crestWidth) => set({ crestWidth })}
        />
        <StructureNumber
          path={`${path}.dam.faceSlopes`}
          label="Slopes of both faces"
          optional
          hint="Added, horizontal to vertical: 3 and 2.5 are 5.5."
          value={dam.faceSlopes}
          onChange={(faceSlopes) => set({ faceSlopes })}
        />
      </FieldRow>
      <FieldRow>
        <PlacedField path={`${path}.dam.embankment`} half>
          {(error) => (
            <RadioGroup
              label="Embankment"
              value={dam.embankment}
              onChange={(embankment) => set({ embankment })}
              options={[
                { value: 'earthfill', label: 'Earthfill' },
                { value: 'nonEarthfill', label: 'Other: rockfill, concrete face, core wall' },
              ]}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path={`${path}.dam.erodibility`} half>
          {(error) => (
            <RadioGroup
              label="Material"
              value={dam.erodibility}
              onChange={(erodibility) => set({ erodibility })}
              options={[
                { value: 'high', label: 'Easily eroded' },
                { value: 'low', label: 'Resists erosion' },
              ]}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </FieldRow>
    </>
  );
}

/** No more digits than they deserve: depths to the centimetre, volumes to four digits. */
const rounded = (data: Partial<DamData>): Partial<DamData> =>
  Object.fromEntries(
    Object.entries(data).map(([key, value]) => [
      key,
      typeof value === 'number' ? Number(value.toPrecision(4)) : value,
    ]),
  );
