import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import type { Study } from '@/shared/studies/types';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { pathSteps } from './pathSteps';

/** Where the study stands, step by step; each leads to its screen. */
export function PathCard({ study }: { study: Study }) {
  const { colours } = useTheme();
  return (
    <Card title="Path of the study">
      <List label="Steps of the study">
        {pathSteps(study).map((step) => (
          <Link key={step.name} href={step.href} asChild>
            <Pressable role="link" style={styles.step}>
              <View
                style={[
                  styles.mark,
                  { borderColor: step.isDone ? colours.moss : colours.edge },
                  step.isDone ? { backgroundColor: colours.moss } : null,
                ]}
              />
              <Txt variant="lead" strong style={styles.name}>
                {step.name}
              </Txt>
              <Txt tone="soft" style={styles.state}>
                {step.state}
              </Txt>
            </Pressable>
          </Link>
        ))}
      </List>
    </Card>
  );
}

const styles = StyleSheet.create({
  step: { flexDirection: 'row', alignItems: 'center', gap: space.two, minHeight: 28 },
  mark: { width: 12, height: 12, borderRadius: 6, borderWidth: 2 },
  name: { width: 96 },
  state: { flex: 1 },
});
