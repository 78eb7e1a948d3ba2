import { useLocalSearchParams } from 'expo-router';
import { View } from 'react-native';
import { isApiError } from '@/components/queries/ApiError';
import { useVerification } from '@/components/queries/verification';
import { space } from '@/components/theme/tokens';
import { LinkTxt } from '@/components/ui/LinkTxt';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { AuthPage } from '../auth/AuthPage';
import { CodeForm } from './CodeForm';
import { Standing } from './Standing';

/** Public: whether a report was signed, by whom and when, and whether a file is that very report. */
export function VerificationPage() {
  const { code = '' } = useLocalSearchParams<{ code?: string }>();
  const { data, error, isFetching, refetch } = useVerification(code);
  const isUnknown = isApiError(error, 'notFound');
  return (
    <AuthPage
      title="Verify a report"
      lead={
        code
          ? `Verification code ${code}`
          : 'Every signed report carries a code on its cover. It tells whether the report was signed and whether that still stands.'
      }
      after={code ? <LinkTxt href="/verify">Verify another report</LinkTxt> : undefined}
    >
      {code === '' ? <CodeForm /> : null}
      {code && isFetching && !data ? <Loading what="Looking the code up…" /> : null}
      {isUnknown ? (
        <View style={{ gap: space.two }}>
          <Notice tone="danger" title="No signed report carries this code">
            <Txt>
              Compare it letter by letter with the cover of the report. If it is the same, the
              report was not signed here: do not rely on it, and ask whoever gave it to you.
            </Txt>
          </Notice>
          <CodeForm start={code} />
        </View>
      ) : null}
      {error && !isUnknown ? (
        <ErrorState
          error={error}
          title="The code could not be looked up"
          retry={() => void refetch()}
        />
      ) : null}
      {data ? <Standing found={data} /> : null}
    </AuthPage>
  );
}
