import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { SelectField } from '@/components/ui/SelectField';
import type { ReachRow } from '@/shared/reaches/types';
import { CopyGeometryDialog } from './CopyGeometryDialog';

interface GeometryChoiceProps {
  reach: ReachRow;
  reaches: readonly ReachRow[];
}

/** Which geometry is shown, and the way to change its sections: by a working copy where it is that of a survey. */
export function GeometryChoice({ reach, reaches }: GeometryChoiceProps) {
  const { study, may } = useCurrentStudy();
  const [isCopying, setIsCopying] = useState(false);
  const isWorking = reach.copiedFrom !== null;
  return (
    <View style={styles.box}>
      {reaches.length > 1 ? (
        <View style={styles.choice}>
          <SelectField
            label="Geometry"
            value={String(reach.id)}
            options={reaches.map(({ id, name, copiedFrom }) => ({
              value: String(id),
              label: copiedFrom === null ? name : `${name}, working geometry`,
            }))}
            onChange={(id) => router.setParams({ reach: id })}
          />
        </View>
      ) : null}
      {may('reach.change') ? (
        <View style={styles.change}>
          {isWorking ? (
            <Button label="Change its sections" href={`/studies/${study.id}/reach/${reach.id}`} />
          ) : (
            <Button
              label="Make a working geometry"
              hint="A copy in which sections may be changed; the survey stays as it is."
              onPress={() => setIsCopying(true)}
            />
          )}
        </View>
      ) : null}
      {isCopying ? <CopyGeometryDialog reach={reach} onClose={() => setIsCopying(false)} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two, alignItems: 'flex-end' },
  change: { flexShrink: 1, minWidth: 0, maxWidth: '100%' },
  choice: { flexGrow: 1, flexBasis: 220, maxWidth: 360 },
});
