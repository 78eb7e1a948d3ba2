import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useEditing } from './editorContext';

/** Always within reach: what is wrong, back and forth, save. */
export function EditBar() {
  const { editor, goTo } = useEditing();
  const [first] = editor.faults;
  const faulty = editor.sections.find(({ id }) => id === first?.sectionId);
  const words =
    editor.unsavable ??
    (editor.isDirty ? 'Not saved yet.' : editor.wasSaved ? 'Saved.' : 'Nothing changed.');
  return (
    <View style={styles.bar}>
      <View style={styles.trouble}>
        <Trouble />
      </View>
      <View role="status" style={styles.words}>
        <Txt variant="small" tone={editor.unsavable ? 'brick' : 'soft'}>
          {first && editor.unread.count === 0
            ? `${words} ${first.sectionId}: ${first.message}`
            : words}
        </Txt>
      </View>
      <View style={styles.buttons}>
        {faulty ? (
          <Button label="Go there" kind="quiet" onPress={() => goTo(faulty.chainage)} />
        ) : null}
        <Button
          label="Undo"
          name={editor.canUndo ? `Undo: ${editor.canUndo}` : 'Undo'}
          disabled={!editor.canUndo}
          onPress={editor.undo}
        />
        <Button
          label="Redo"
          name={editor.canRedo ? `Redo: ${editor.canRedo}` : 'Redo'}
          disabled={!editor.canRedo}
          onPress={editor.redo}
        />
        <Button
          label="Save"
          kind="solid"
          busy={editor.isSaving}
          disabled={!editor.isDirty || editor.unsavable !== null}
          onPress={editor.save}
        />
      </View>
    </View>
  );
}

/** Saving went wrong: refused, or overtaken by somebody else. */
function Trouble() {
  const { editor } = useEditing();
  if (!editor.isBehind)
    return editor.saveError ? <ErrorState title="Not saved" error={editor.saveError} /> : null;
  return (
    <Notice tone="attention" title="Somebody else saved this geometry meanwhile">
      <Txt>
        What you changed is still here and not saved. Save it over theirs: the sections that you
        changed become as yours, the others stay as theirs. Or throw yours away and go on from
        theirs.
      </Txt>
      <View style={styles.row}>
        <Button
          label="Save mine over theirs"
          disabled={editor.unsavable !== null}
          busy={editor.isSaving}
          onPress={editor.saveOver}
        />
        <Button label="Throw mine away" kind="danger" onPress={editor.throwAway} />
      </View>
    </Notice>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'flex-end',
    columnGap: space.two,
    rowGap: space.half,
  },
  trouble: { width: '100%' },
  words: { flexShrink: 1 },
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.one },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one },
});
