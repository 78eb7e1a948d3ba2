import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/Button';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { space } from '@/components/theme/tokens';
import { LIMITS } from '@/shared/limits';
import { freeName, newStructure } from '@/shared/scenarios/structures/newStructure';
import { structureKinds, type StructureBody } from '@/shared/scenarios/structures/schemas';
import { STRUCTURE_NAMES } from '@/shared/structures/structureWords';
import { formatWithUnit } from '@/shared/units/format';
import { EditorPart } from '../EditorPart';
import { useEditing } from '../editorContext';
import { StructureEditor } from './StructureEditor';
import { StructuresAlong } from './StructuresAlong';

type Kind = StructureBody['kind'];
const KINDS = Object.keys(structureKinds) as Kind[];

interface Props {
  /** The place chosen on the ribbon, m. */
  at: number | null;
}

/** What stands in the river. */
export function StructuresPart({ at }: Props) {
  const { draft, dispatch, reach, isLocked } = useEditing();
  const system = useUnitSystem();
  const [kind, setKind] = useState<Kind>('weir');
  // Fields below keep what is typed: after one is taken out the others are drawn anew.
  const [removed, setRemoved] = useState(0);
  const { structures } = draft;
  const taken = structures.map(({ id }) => id);
  const upstream = draft.upstream.byKind[draft.upstream.kind];
  const isFull = structures.length >= LIMITS.structures;
  const place = reach && placeFor(kind, upstream.kind === 'reservoir', at, reach);

  return (
    <EditorPart part="structures">
      {structures.length === 0 ? (
        <Txt tone="soft">
          None: the water meets no weir, gate, culvert, bridge or dam. All water at a structure
          passes through it.
        </Txt>
      ) : (
        <StructuresAlong />
      )}
      {structures.map((structure, index) => (
        <StructureEditor
          key={`${removed} ${index}`}
          {...{ structure, index }}
          onRemove={() => {
            setRemoved(removed + 1);
            dispatch({ type: 'structureRemoved', index });
          }}
          copyName={freeName(structure.kind, taken)}
        />
      ))}
      {isLocked || !reach || place === undefined ? null : (
        <View style={styles.add}>
          <View style={styles.kind}>
            <SelectField
              label="Kind"
              hint="Proposed from the section where it stands; every number can be changed."
              value={kind}
              options={KINDS.map((value) => ({ value, label: STRUCTURE_NAMES[value] }))}
              onChange={setKind}
            />
          </View>
          <Button
            label={`Add a ${STRUCTURE_NAMES[kind].toLowerCase()} at ${formatWithUnit(place, 'chainage', system)}`}
            disabled={isFull}
            hint={isFull ? `At most ${LIMITS.structures}.` : undefined}
            onPress={() => {
              const { sections } = reach;
              const where = { chainage: place, sections, upstream, taken };
              dispatch({ type: 'structureAdded', structure: newStructure(kind, where) });
            }}
          />
        </View>
      )}
    </EditorPart>
  );
}

interface Ends {
  firstChainage: number;
  lastChainage: number;
}

/** The chosen place within the reach; the head for the dam of a reservoir, else the middle where none fits. */
function placeFor(kind: Kind, hasReservoir: boolean, at: number | null, reach: Ends): number {
  const { firstChainage: first, lastChainage: last } = reach;
  if (at !== null && at > first && at < last) return at;
  if (hasReservoir && (kind === 'breach' || at === first)) return first;
  return Math.round((first + last) / 2);
}

const styles = StyleSheet.create({
  add: { gap: space.two, alignItems: 'flex-start' },
  kind: { alignSelf: 'stretch', maxWidth: 440 },
});
