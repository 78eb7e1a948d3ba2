import { Redirect, Slot } from 'expo-router';
import { Shell } from '@/components/layout/Shell';
import { useSession } from '@/components/queries/SessionProvider';
import { entryAddress } from '@/components/screens/auth/entryAddress';
import { SignInAgain } from '@/components/screens/auth/SignInAgain';

export { BrokenScreen as ErrorBoundary } from '@/components/layout/BrokenScreen';

/** Everything behind the sign-in. */
export default function MainLayout() {
  const { state } = useSession();
  if (state.is === 'signedOut') {
    const next = entryAddress;
    const leadsBack = !state.byChoice && next !== '/';
    return <Redirect href={leadsBack ? { pathname: '/sign-in', params: { next } } : '/sign-in'} />;
  }
  return (
    <Shell>
      <Slot />
      {state.is === 'interrupted' ? <SignInAgain me={state.me} /> : null}
    </Shell>
  );
}
