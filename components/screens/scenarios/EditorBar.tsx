import { StyleSheet, View } from 'react-native';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import { useEditing } from './editorContext';
import { jumpTo } from './jumpTo';
import { SaveTrouble } from './SaveTrouble';

interface EditorBarProps {
  /** Why it cannot be routed yet. */
  reason: string | null;
  route: () => void;
  isRouting: boolean;
  routeError: Error | null;
}

/** Always within reach while the long form scrolls: what is missing, save, and what to do next. */
export function EditorBar({ reason, route, isRouting, routeError }: EditorBarProps) {
  const { may } = useCurrentStudy();
  const { editor } = useEditing();
  const [first] = editor.faults;
  const words = editor.unsavable ?? reason ?? 'Ready to route.';
  return (
    <View style={styles.bar}>
      <View style={styles.trouble}>
        <SaveTrouble />
        {routeError ? <ErrorState title="The run was not started" error={routeError} /> : null}
      </View>
      <View role="status" style={styles.words}>
        <Txt variant="small" tone="soft">
          {words}
        </Txt>
      </View>
      <View style={styles.buttons}>
        {first ? <Button label="Go there" kind="quiet" onPress={() => jumpTo(first.path)} /> : null}
        <Button
          label="Save"
          busy={editor.isSaving}
          disabled={!editor.isDirty || editor.unsavable !== null}
          onPress={editor.save}
        />
        {may('run.request') ? (
          <Button
            label="Route this flood"
            kind="solid"
            busy={isRouting}
            disabled={reason !== null}
            onPress={route}
          />
        ) : null}
      </View>
    </View>
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
  // Over the buttons that it is about, where it is seen wherever the form is scrolled to.
  trouble: { width: '100%' },
  words: { flexShrink: 1 },
  buttons: { flexDirection: 'row', gap: space.one * 1.5 },
});
