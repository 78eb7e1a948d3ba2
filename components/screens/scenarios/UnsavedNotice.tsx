import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useEditing } from './editorContext';

/** What is typed and not saved is kept, and can be thrown away. */
export function UnsavedNotice() {
  const { editor } = useEditing();
  if (!editor.isDirty || editor.isBehind) return null;
  return (
    <Notice
      tone="attention"
      title={editor.wasKept ? 'What you had not saved is here again' : 'Not saved yet'}
    >
      <Txt>It stays in this browser tab until you save it or throw it away.</Txt>
      <View style={styles.buttons}>
        <Button label="Throw the changes away" kind="danger" onPress={editor.throwAway} />
      </View>
    </Notice>
  );
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one },
});
