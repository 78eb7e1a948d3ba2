import { useInvitationPreview } from '@/components/queries/accounts';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Notice } from '@/components/ui/Notice';
import { AcceptInvitation } from './AcceptInvitation';
import { AuthPage } from './AuthPage';
import { useLinkToken } from './useLinkToken';
import { isApiError } from '@/components/queries/ApiError';

/** Where the link of the invitation mail leads. */
export function InvitationScreen() {
  const token = useLinkToken();
  const { data, error, refetch } = useInvitationPreview(token);
  if (data) return <AcceptInvitation token={token} invitation={data} />;
  const isSpent = token === '' || isApiError(error, 'gone', 'notFound', 'invalid');
  if (isSpent) {
    return (
      <AuthPage title="This invitation no longer holds">
        <Notice tone="attention">
          It was used, withdrawn, or is older than seven days. If you have accepted it before, sign
          in; otherwise ask whoever invited you to send it again.
        </Notice>
        <Button kind="solid" label="Sign in" href="/sign-in" wide />
      </AuthPage>
    );
  }
  return (
    <AuthPage title="Invitation">
      {error ? (
        <ErrorState
          error={error}
          title="The invitation could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading the invitation…" />
      )}
    </AuthPage>
  );
}
