import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { FrontView } from '@/components/charts/FrontView';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { NumberField } from '@/components/ui/NumberField';
import { TextField } from '@/components/ui/TextField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { LIMITS } from '@/shared/limits';
import { sectionNear } from '@/shared/structures/crests';
import { STRUCTURE_NAMES } from '@/shared/structures/structureWords';
import type { StructureBody } from '@/shared/scenarios/structures/schemas';
import { FieldRow } from '../EditorPart';
import { useEditing } from '../editorContext';
import { PlacedField } from '../PlacedField';
import { BreachFields } from './BreachFields';
import { BridgeFields } from './BridgeFields';
import { CulvertFields } from './CulvertFields';
import { SluiceFields } from './SluiceFields';
import { StructureProvider } from './structureContext';
import { WeirFields } from './WeirFields';

const FIELDS: Record<StructureBody['kind'], () => React.JSX.Element> = {
  weir: WeirFields,
  sluice: SluiceFields,
  culvert: CulvertFields,
  bridge: BridgeFields,
  breach: BreachFields,
};

interface Props {
  structure: StructureBody;
  index: number;
  /** A name for its copy. */
  copyName: string;
  onRemove: () => void;
}

/** One structure: where it stands, its own fields, a view of it as they are typed. */
export function StructureEditor({ structure, index, copyName, onRemove }: Props) {
  const { draft, dispatch, reach, isLocked: disabled } = useEditing();
  const { colours } = useTheme();
  const system = useUnitSystem();
  const { kind, id, chainage, note } = structure;
  const path = `structures[${index}]`;
  const title = id || `${STRUCTURE_NAMES[kind]} without a name`;
  const Fields = FIELDS[kind];
  const [isOpen, setOpen] = useState(true);
  const change = (to: Partial<Pick<StructureBody, 'id' | 'chainage' | 'note'>>) =>
    dispatch({ type: 'structureChanged', index, change: to });
  const head = reach?.firstChainage;
  const isOfReservoir = draft.upstream.kind === 'reservoir';
  return (
    <View role="group" aria-label={title} style={[styles.one, { borderTopColor: colours.line }]}>
      <View style={styles.head}>
        <Txt strong heading={3}>
          {title}
        </Txt>
        <Txt tone="soft">{STRUCTURE_NAMES[kind]}</Txt>
        <Button
          kind="quiet"
          label={isOpen ? 'Fold' : 'Open'}
          name={`${isOpen ? 'Fold' : 'Open'} ${title}`}
          onPress={() => setOpen(!isOpen)}
        />
      </View>
      {reach && chainage !== null && Number.isFinite(chainage) ? (
        <FrontView
          structure={structure}
          section={sectionNear(reach.sections, chainage)}
          unitSystem={system}
        />
      ) : null}
      {isOpen ? (
        <StructureProvider value={index}>
          <FieldRow>
            <PlacedField path={`${path}.id`} half>
              {(error) => (
                <TextField
                  label="Name"
                  maxLength={LIMITS.structureName}
                  value={id}
                  onChange={(name) => change({ id: name })}
                  {...{ error, disabled }}
                />
              )}
            </PlacedField>
            <PlacedField path={`${path}.chainage`} half>
              {(error) => (
                <NumberField
                  label="At chainage"
                  quantity="chainage"
                  value={chainage}
                  onChange={(at) => change({ chainage: at })}
                  {...{ error, disabled }}
                />
              )}
            </PlacedField>
          </FieldRow>
          {isOfReservoir && head !== undefined && chainage !== head && !disabled ? (
            <Button
              kind="quiet"
              label="Put it into the dam of the reservoir"
              name={`Put it into the dam of the reservoir: ${title}`}
              onPress={() => change({ chainage: head })}
            />
          ) : null}
          <Fields />
          <PlacedField path={`${path}.note`}>
            {(error) => (
              <TextField
                label={kind === 'breach' ? 'Why these values' : 'Note'}
                optional={kind !== 'breach'}
                lines={2}
                maxLength={LIMITS.textLong}
                hint="Where the numbers come from; it is frozen with the run and stands in the report."
                value={note}
                onChange={(text) => change({ note: text })}
                {...{ error, disabled }}
              />
            )}
          </PlacedField>
        </StructureProvider>
      ) : null}
      {disabled ? null : (
        <ButtonRow>
          <Button
            kind="quiet"
            label="Duplicate"
            name={`Duplicate ${title}`}
            disabled={draft.structures.length >= LIMITS.structures}
            onPress={() => dispatch({ type: 'structureDuplicated', index, id: copyName })}
          />
          <Button kind="danger" label="Remove" name={`Remove ${title}`} onPress={onRemove} />
        </ButtonRow>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  one: { gap: space.two, paddingTop: space.two, borderTopWidth: hairline },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.two },
});
