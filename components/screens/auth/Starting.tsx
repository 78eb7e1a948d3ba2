import { StyleSheet, View } from 'react-native';
import { useSession } from '@/components/queries/SessionProvider';
import { Wordmark } from '@/components/layout/Wordmark';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';

/** While the server is asked who is here. */
export function Starting() {
  const { state, start } = useSession();
  const { colours } = useTheme();
  return (
    <View role="main" style={[styles.page, { backgroundColor: colours.paper }]}>
      <Wordmark />
      {state.is === 'unreachable' ? (
        <View style={styles.notice}>
          <ErrorState error={state.error} title="Spate cannot be reached" retry={start} />
        </View>
      ) : (
        <Loading what="Opening…" />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  page: {
    flex: 1,
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.two,
    padding: space.two,
  },
  notice: { maxWidth: 432, width: '100%' },
});
