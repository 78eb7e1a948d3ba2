import type { ErrorBoundaryProps } from 'expo-router';
import { View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';

/** What stands where a screen fell over: the fault is ours, and nothing that was saved is touched. */
export function BrokenScreen({ error, retry }: ErrorBoundaryProps) {
  return (
    <View role="main" style={{ padding: space.two, gap: space.two }}>
      <Notice tone="danger" title="This screen could not be drawn">
        <Txt>
          The fault is in Spate, not in your work: what was saved is safe. Try again; if it comes
          back, tell whoever runs the server these words.
        </Txt>
        <Txt variant="small" tone="soft">
          {error.message}
        </Txt>
        <View>
          <Button label="Try again" onPress={() => void retry()} />
        </View>
      </Notice>
    </View>
  );
}
