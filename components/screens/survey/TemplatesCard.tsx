import { useMutation } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { downloadTemplate, SURVEY_TEMPLATES } from '@/components/queries/surveys';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';

/** Workbooks to fill in, and to see how they are filled in. */
export function TemplatesCard() {
  const units = useUnitSystem();
  const download = useMutation({ mutationFn: downloadTemplate });
  return (
    <Card title="Templates">
      <Txt tone="soft">
        Headings may stand in any order and in other usual words; these are the plainest.
      </Txt>
      <View style={styles.buttons}>
        {SURVEY_TEMPLATES.map(({ path, label }) => (
          <Button
            key={path}
            kind="quiet"
            label={`${label}, XLSX`}
            busy={download.isPending && download.variables.path === path}
            onPress={() => download.mutate({ path, units })}
          />
        ))}
      </View>
      {download.isError ? (
        <ErrorState title="The template was not downloaded" error={download.error} />
      ) : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  buttons: { columnGap: space.two, marginVertical: -space.one },
});
