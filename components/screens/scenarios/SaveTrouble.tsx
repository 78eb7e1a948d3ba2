import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useEditing } from './editorContext';

/** Saving went wrong: refused, or overtaken by somebody else. */
export function SaveTrouble() {
  const { editor } = useEditing();
  if (editor.isBehind && editor.isDirty)
    return (
      <Notice tone="attention" title="Somebody else saved this scenario meanwhile">
        <Txt>
          What you typed is still here and not saved. Save it over theirs, or throw it away and go
          on from theirs.
        </Txt>
        <View style={styles.buttons}>
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
  return editor.saveError ? <ErrorState title="Not saved" error={editor.saveError} /> : null;
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one },
});
