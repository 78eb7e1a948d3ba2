import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { useEditing } from './editorContext';
import { anchorOf, PART_TITLES, partOf, type Part } from './faultPlaces';

/** One card of the editor, with how many things are missing in it. */
export function EditorPart({ part, children }: { part: Part; children: ReactNode }) {
  const { editor } = useEditing();
  const count = editor.faults.filter(({ path }) => partOf(path) === part).length;
  return (
    <View nativeID={anchorOf(part)}>
      <Card title={PART_TITLES[part]} aside={count > 0 ? `${count} to mend` : undefined}>
        {children}
      </Card>
    </View>
  );
}

/** Fields side by side where there is room. */
export function FieldRow({ children }: { children: ReactNode }) {
  return <View style={styles.row}>{children}</View>;
}

const styles = StyleSheet.create({
  // Hints differ in length: the boxes that are typed into stand on one line.
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two, alignItems: 'flex-end' },
});
